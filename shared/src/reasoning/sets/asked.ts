import type { Exponents } from '../evidence/exponents.js';
import type { CheckedPanel } from '../validation/checked-panel.js';
import type { View } from '../view.js';
import { FixedPower } from './fixed-power.js';
import type { RowProduct } from './row-product.js';
import { type RowSpace, type RowTable, rowSpace, rowTable } from './row-table.js';
import { addRowLogs } from './set-posterior.js';
import type { SetTable } from './set-table.js';

/** A posterior over sets that questions are asked about. */
export interface Posterior {
  panel: CheckedPanel;
  table: SetTable;
  view: View;
  exponents: Exponents;
  /** Posterior of each set. */
  shares: Float64Array;
  /** Working space. */
  product: RowProduct;
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
  private readonly groups = new Map<number, Float64Array>();

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

  /** For each set Σ ln P' over the observed and judged rows of a group, without the exponent. */
  groupLogs(group: number): Float64Array {
    const known = this.groups.get(group);
    if (known) return known;
    const { panel, table, view, product } = this.posterior;
    const rows = [...panel.findings.keys()].filter((r) => {
      const finding = panel.findings[r]!;
      return finding.group === group && finding.observed !== null && view.judged[r];
    });
    const logs = new Float64Array(table.size);
    addRowLogs(panel, view, rows, 1, logs, product);
    this.groups.set(group, logs);
    return logs;
  }
}
