/** The tables of this domain. */
export const peopleEntities: (new () => object)[] = [];
