import type { Exponents } from '../evidence/exponents.js';
import type { CheckedPanel } from '../validation/checked-panel.js';
import type { View } from '../view.js';
import { FixedPower } from './fixed-power.js';
import { type RowSpace, type RowTable, rowSpace, rowTable } from './row-table.js';
import type { SetTable } from './set-table.js';

/** A posterior over sets that questions are asked about. */
export interface Posterior {
  panel: CheckedPanel;
  table: SetTable;
  view: View;
  exponents: Exponents;
  /** Posterior of each set. */
  shares: Float64Array;
  /** For each group Σ ln P' over its observed rows, without the exponent. */
  groupLogs: ReadonlyMap<number, Float64Array>;
}

/** An answer over some of the sets, and the largest part of it that those left aside could account for. */
export interface Bounded<Value> {
  value: Value;
  missed: number;
}

/** The rows and powers that answers are made of. */
export class Asked {
  private readonly room: RowSpace;
  private readonly powers = new Map<number, FixedPower>();

  constructor(readonly posterior: Posterior) {
    this.room = rowSpace(posterior.table);
  }

  /** The table of a row in one view, for the observed level unless another is given; the next call writes over it. */
  row({ cells }: View, finding: number, level?: number): RowTable {
    const { panel } = this.posterior;
    const described = panel.findings[finding]!;
    return rowTable(this.room, cells, described, panel.columns, level ?? described.observed ?? 0);
  }

  power(exponent: number): FixedPower {
    const known = this.powers.get(exponent);
    if (known) return known;
    const power = new FixedPower(exponent);
    this.powers.set(exponent, power);
    return power;
  }
}
