import { describe, expect, it } from 'vitest';
import { newPasswordFaults } from './new-password';

describe('newPasswordFaults', () => {
  it('takes twelve characters typed the same twice', () => {
    expect(newPasswordFaults('password', 'twelve chars', 'twelve chars')).toEqual([]);
  });

  it('names all that is wrong at once', () => {
    expect(newPasswordFaults('newPassword', 'short', 'shorter').map(({ path }) => path)).toEqual([
      'newPassword',
      'again',
    ]);
  });
});
