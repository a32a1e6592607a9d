/** The tables of this domain. */
export const summariesEntities: (new () => object)[] = [];
