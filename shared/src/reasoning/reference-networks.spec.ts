import bayesjs, { type ICombinations, type INetwork } from 'bayesjs';
import { describe, it } from 'vitest';
import { expectClose } from './testing/expect-close.js';

/*
 * The library that panels are checked against is itself held against published
 * networks first. Neither is a panel's network: their tables are no noisy-ORs.
 */
const flag = (name: string, present: number): INetwork => ({
  [name]: { id: name, states: ['yes', 'no'], parents: [], cpt: { yes: present, no: 1 - present } },
});

/** `present` for each combination of the parents, the last parent changing fastest, yes before no. */
function child(name: string, parents: string[], present: number[]): INetwork {
  const cpt = present.map((p, index) => ({
    when: Object.fromEntries(
      parents.map((parent, at) => [parent, (index >> (parents.length - 1 - at)) & 1 ? 'no' : 'yes']),
    ),
    then: { yes: p, no: 1 - p },
  }));
  return { [name]: { id: name, states: ['yes', 'no'], parents, cpt } };
}

function expectInferred(network: INetwork, evidence: ICombinations, expected: Record<string, number>): void {
  const inferred = bayesjs.inferAll(network, evidence, { precision: 15, force: true });
  for (const [name, p] of Object.entries(expected)) expectClose(inferred[name]!['yes'], p);
}

describe('the chest clinic of Lauritzen & Spiegelhalter 1988 (JRSS B 50:157-224)', () => {
  const clinic: INetwork = {
    ...flag('asia', 0.01),
    ...flag('smoke', 0.5),
    ...child('tub', ['asia'], [0.05, 0.01]),
    ...child('lung', ['smoke'], [0.1, 0.01]),
    ...child('bronc', ['smoke'], [0.6, 0.3]),
    ...child('either', ['lung', 'tub'], [1, 1, 1, 0]),
    ...child('xray', ['either'], [0.98, 0.05]),
    ...child('dysp', ['bronc', 'either'], [0.9, 0.8, 0.7, 0.1]),
  };

  it('before any evidence', () => {
    expectInferred(
      clinic,
      {},
      { tub: 0.0104, lung: 0.055, bronc: 0.45, either: 0.064828, xray: 0.11029004, dysp: 0.4359706 },
    );
  });

  it('after a journey and with dyspnoea (published 0.0878, 0.0995, 0.8114, from memory; more digits by exact fractions)', () => {
    expectInferred(
      clinic,
      { asia: 'yes', dysp: 'yes' },
      { tub: 0.08775096498292188, lung: 0.09952514509455444, bronc: 0.8114020715892366 },
    );
  });

  it('with the X-ray, either way (exact fractions)', () => {
    expectInferred(
      clinic,
      { asia: 'yes', dysp: 'yes', xray: 'yes' },
      { tub: 0.39171172000757926, lung: 0.44427050775543164, bronc: 0.6288217759739857 },
    );
    expectInferred(
      clinic,
      { asia: 'yes', dysp: 'yes', xray: 'no' },
      { tub: 0.0022486953119612873, lung: 0.002550418986730776, bronc: 0.8627607730473658 },
    );
  });
});

describe('the burglar alarm of Russell & Norvig (AIMA, 3rd ed., chapter 14)', () => {
  const alarm: INetwork = {
    ...flag('burglary', 0.001),
    ...flag('earthquake', 0.002),
    ...child('alarm', ['burglary', 'earthquake'], [0.95, 0.94, 0.29, 0.001]),
    ...child('john', ['alarm'], [0.9, 0.05]),
    ...child('mary', ['alarm'], [0.7, 0.01]),
  };

  it('after both calls (published 0.284, from memory; more digits by exact fractions)', () => {
    expectInferred(
      alarm,
      { john: 'yes', mary: 'yes' },
      { burglary: 0.28417183536439294, earthquake: 0.17606683840507922, alarm: 0.7606920388631077 },
    );
  });

  it('explains the burglary away by an earthquake (exact fractions)', () => {
    expectInferred(alarm, { alarm: 'yes' }, { burglary: 0.373551228281836 });
    expectInferred(alarm, { alarm: 'yes', earthquake: 'yes' }, { burglary: 0.0032684235876969656 });
  });

  it('predicts the calls from a burglary (published 0.9400, 0.8490, 0.6586 in the tests of bayesjs)', () => {
    expectInferred(alarm, { burglary: 'yes' }, { alarm: 0.94002, john: 0.849017, mary: 0.6586138 });
  });
});
