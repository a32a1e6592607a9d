/** The tables of this domain. */
export const differentialEntities: (new () => object)[] = [];
