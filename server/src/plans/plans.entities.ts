/** The tables of this domain. */
export const plansEntities: (new () => object)[] = [];
