import type { ICombinations, INetwork } from 'bayesjs';
import { type NoisyOrRow, elicited } from './independent-panel.js';

/** All combinations of yes and no for these conditions, with their noisy-OR chance of the finding. */
function table(row: NoisyOrRow) {
  const causes = row.links;
  return Array.from({ length: 2 ** causes.length }, (_, bits) => {
    const here = causes.filter((_cause, index) => (bits >> index) & 1);
    const absent = here.reduce((chance, [, link]) => chance * (1 - link), 1 - row.leak);
    const when = Object.fromEntries(
      causes.map(([cause], index) => [`condition ${cause}`, (bits >> index) & 1 ? 'yes' : 'no']),
    );
    return { when, then: { yes: 1 - absent, no: absent } };
  });
}

/**
 * The same network in the terms of bayesjs: independent conditions, findings
 * with their whole tables, and for each doubtful finding the report of it.
 */
export function bayesNetwork(priors: readonly number[], rows: readonly NoisyOrRow[]) {
  const network: INetwork = {};
  const evidence: ICombinations = {};
  priors.forEach((prior, k) => {
    network[`condition ${k}`] = {
      id: `condition ${k}`,
      states: ['yes', 'no'],
      parents: [],
      cpt: { yes: prior, no: 1 - prior },
    };
  });
  rows.forEach((row, index) => {
    const id = `finding ${index}`;
    const seen = row.observed === 1 ? 'yes' : 'no';
    network[id] = {
      id,
      states: ['yes', 'no'],
      parents: row.links.map(([cause]) => `condition ${cause}`),
      cpt: table(row),
    };
    const reliability = row.reliability ?? 1;
    if (reliability === 1) {
      evidence[id] = seen;
      return;
    }
    const columns = elicited(priors.length, row);
    const mean = columns.reduce((sum, p) => sum + p, 0) / columns.length;
    const reported = (present: number) => reliability * present + (1 - reliability) * mean;
    network[`report ${index}`] = {
      id: `report ${index}`,
      states: ['yes', 'no'],
      parents: [id],
      cpt: [1, 0].map((present) => ({
        when: { [id]: present ? 'yes' : 'no' },
        then: { yes: reported(present), no: 1 - reported(present) },
      })),
    };
    evidence[`report ${index}`] = seen;
  });
  return { network, evidence };
}
