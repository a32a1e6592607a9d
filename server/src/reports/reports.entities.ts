/** The tables of this domain. */
export const reportsEntities: (new () => object)[] = [];
