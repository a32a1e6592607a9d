/** The tables of this domain. */
export const findingsEntities: (new () => object)[] = [];
