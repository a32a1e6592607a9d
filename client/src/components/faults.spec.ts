import { invitePersonSchema } from '@weighhouse/shared/contracts/people';
import { describe, expect, it } from 'vitest';
import { faultOf, faultsIn, fieldId } from './faults';

describe('faults', () => {
  it('finds what is wrong at a path or below it, and nothing of a neighbour with the same beginning', () => {
    const faults = [
      { path: 'actions.0.what', message: 'must not be empty' },
      { path: 'name', message: 'must not be empty' },
      { path: 'nameOther', message: 'must be text' },
    ];
    expect(faultOf(faults, 'actions')).toBe('Must not be empty.');
    expect(faultOf(faults, 'name')).toBe('Must not be empty.');
    expect(faultOf(faults, 'action')).toBeNull();
    expect(faultOf(undefined, 'name')).toBeNull();
    expect(faultOf([{ path: 'team[1].reason', message: 'must be text' }], 'team')).toBe('Must be text.');
  });

  it('says the same as the server does, all faults at once', () => {
    const faults = faultsIn(invitePersonSchema, {
      email: 'nobody',
      name: ' ',
      specialty: 'Neurology',
      centreId: 'x',
      roles: [],
    });
    expect(faults.map((fault) => fault.path).sort()).toEqual(['centreId', 'email', 'name', 'roles']);
  });

  it('makes an id that a link can point to', () => {
    expect(fieldId('actions.0.what')).toBe('field-actions-0-what');
  });
});
