import { describe, expect, it } from 'vitest';
import { findAccount } from './account.mjs';

describe('finding a system user', () => {
  const passwd =
    'root:x:0:0:root:/root:/bin/bash\nmysqlx:x:7:7::/:/bin/false\nmysql:x:102:105:MySQL:/nonexistent:/bin/false\n';

  it('takes the line with exactly that name', () => {
    expect(findAccount('mysql', passwd)).toEqual({ name: 'mysql', uid: 102, gid: 105 });
  });

  it('finds nobody by a part of a name', () => {
    expect(findAccount('mysq', passwd)).toBeNull();
  });
});
