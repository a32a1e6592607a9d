import { expect, it } from 'vitest';
import { groupsInput, valuesOfGroups } from './group-values';

it('opens groups as they are and sends them back the same', () => {
  const groups = [{ id: 'g1', label: 'General symptoms', overlap: 0.33, reason: 'one cause' }];
  expect(groupsInput(valuesOfGroups(groups), 'because')).toEqual({ groups, faults: [] });
});

it('sends a new group without an id and without an empty reason', () => {
  expect(groupsInput([{ label: ' Blood ', overlap: '50', reason: ' ' }], 'because').groups).toEqual([
    { label: 'Blood', overlap: 0.5 },
  ]);
});

it.each(['', '101', '-1', '33.3', 'half'])('refuses an overlap of %j', (overlap) => {
  expect(
    groupsInput([{ label: 'Blood', overlap, reason: '' }], 'because').faults.map((fault) => fault.path),
  ).toEqual(['groups.0.overlap']);
});

it('names every fault and always asks for a reason', () => {
  const faults = groupsInput([{ label: ' ', overlap: 'x', reason: '' }], '  ').faults;
  expect(faults.map((fault) => fault.path)).toEqual(['groups.0.label', 'groups.0.overlap', 'reason']);
});
