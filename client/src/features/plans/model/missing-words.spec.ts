import { describe, expect, it } from 'vitest';
import { isOfText, missingWords } from './missing-words';

describe('missing parts', () => {
  it('name their field, or their action as people count', () => {
    expect(missingWords({ path: 'certainty', message: 'must say how certain it is' })).toBe(
      'How certain it is: must say how certain it is',
    );
    expect(missingWords({ path: 'actions[1].due', message: 'must say by when' })).toBe(
      'Action 2 must say by when',
    );
    expect(missingWords({ path: 'actions', message: 'must name at least one action' })).toBe(
      'Actions: must name at least one action',
    );
    expect(missingWords({ path: 'plan', message: 'must be written first' })).toBe(
      'The plan must be written first',
    );
    expect(missingWords({ path: 'round', message: 'a sealed round is open' })).toBe('A sealed round is open');
  });

  it('stand in the way of asking only where they are of the text', () => {
    expect(isOfText({ path: 'actions[0].ownerId', message: '' })).toBe(true);
    expect(isOfText({ path: 'stances', message: '' })).toBe(false);
    expect(isOfText({ path: 'round', message: '' })).toBe(false);
  });
});
