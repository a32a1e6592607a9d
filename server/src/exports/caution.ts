/** Stands in everything that leaves the application. */
export const caution =
  'Supports a panel’s discussion. It is not a diagnosis and replaces no clinical judgement, local policy, licensed practice or emergency care.';
