import fc from 'fast-check';
import bayesjs from 'bayesjs';
import { describe, it } from 'vitest';
import { assess } from './assess.js';
import { bayesNetwork } from './testing/bayes-network.js';
import { expectClose } from './testing/expect-close.js';
import { type NoisyOrRow, independentPanel } from './testing/independent-panel.js';
import { holds } from './testing/laws-hold.js';
import { sixteenConditions, sixteenConditionsFolded } from './testing/sixteen-conditions.js';

/*
 * The other library knows nothing of panels, pools or sets: it is given the
 * conditions as independent parents and each finding's whole table, and must
 * come to the same standing. How the panel gets the same prior is explained at
 * `independentPanel`. A doubtful report is a child of its finding there.
 */
const share = (low: number, high: number) =>
  fc.integer({ min: low * 1000, max: high * 1000 }).map((thousandths) => thousandths / 1000);

const networks = fc.integer({ min: 2, max: 4 }).chain((conditions) =>
  fc.record({
    priors: fc.array(share(0.02, 0.4), { minLength: conditions, maxLength: conditions }),
    rows: fc.array(
      fc.record({
        leak: share(0.005, 0.5),
        links: fc
          .uniqueArray(fc.nat(conditions - 1), { minLength: 1, maxLength: conditions })
          .chain((causes) =>
            fc.tuple(...causes.map((cause) => share(0.05, 0.95).map((link) => [cause, link] as const))),
          ),
        observed: fc.constantFrom(0, 1),
        reliability: fc.constantFrom(1, 1, 0.7, 0.4),
      }),
      { minLength: 1, maxLength: 4 },
    ),
  }),
);

describe('a two-level network', () => {
  it('has the standing that bayesjs infers', () => {
    holds(networks, ({ priors, rows }: { priors: number[]; rows: NoisyOrRow[] }) => {
      const panel = independentPanel(priors, rows);
      // The chair may not say that more than half of such patients have several.
      fc.pre((panel.coexistence ?? 0) <= 0.5);
      const { network, evidence } = bayesNetwork(priors, rows);
      const inferred = bayesjs.inferAll(network, evidence, { precision: 15, force: true });
      const { standing } = assess(panel, { only: 'standing' });
      expectClose(
        standing.slice(0, -1),
        priors.map((_, k) => inferred[`condition ${k}`]!['yes']),
      );
    });
  });

  it('of sixteen conditions and 21 findings has it too', () => {
    const { network, evidence } = sixteenConditionsFolded();
    const inferred = bayesjs.inferAll(network, evidence, { precision: 15, force: true });
    expectClose(
      assess(sixteenConditions()).standing.slice(0, -1),
      Array.from({ length: 16 }, (_, k) => inferred[`condition ${k}`]!['yes']),
    );
  });
});
