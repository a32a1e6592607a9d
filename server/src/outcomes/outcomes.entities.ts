/** The tables of this domain. */
export const outcomesEntities: (new () => object)[] = [];
