import type { ColumnOptions } from 'typeorm';

/** A moment with milliseconds, all that a JavaScript Date carries. */
export const moment = (options: ColumnOptions = {}): ColumnOptions => ({
  type: 'datetime',
  precision: 3,
  ...options,
});

const asNumber = {
  to: (value: number | null) => value,
  from: (value: string | null) => (value === null ? null : Number(value)),
};

/** An exact decimal; the driver hands it over as text. */
export const numeric = (precision: number, scale: number, options: ColumnOptions = {}): ColumnOptions => ({
  type: 'decimal',
  precision,
  scale,
  transformer: asNumber,
  ...options,
});
