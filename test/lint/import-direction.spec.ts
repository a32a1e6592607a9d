import { describe, expect, it } from 'vitest';
import { importFault } from './import-direction.mjs';
import { importTarget } from './import-target.mjs';

const verdict = (from: string, specifier: string): string =>
  importFault(from, importTarget(from, specifier)) === null ? 'allowed' : 'refused';

describe('what a file may import', () => {
  it.each([
    // shared
    ['shared/src/contracts/cases.ts', 'zod', 'allowed'],
    ['shared/src/seals/seal.ts', 'canonicalize', 'allowed'],
    ['shared/src/contracts/cases.ts', './common.js', 'allowed'],
    ['shared/src/contracts/cases.ts', '@weighhouse/shared/access/can', 'allowed'],
    ['shared/src/contracts/cases.ts', '@nestjs/common', 'refused'],
    ['shared/src/contracts/cases.ts', 'react', 'refused'],
    ['shared/src/contracts/cases.ts', 'node:fs', 'refused'],
    ['shared/src/contracts/cases.ts', 'fs/promises', 'refused'],
    ['shared/src/contracts/cases.ts', '../../../server/src/cases/cases.service.js', 'refused'],
    ['shared/src/contracts/cases.ts', '@weighhouse/server/main', 'refused'],
    ['shared/src/reasoning/command.ts', 'node:process', 'allowed'],
    ['shared/src/reasoning/commandment.ts', 'node:process', 'refused'],
    ['shared/src/reasoning/pool/pool.spec.ts', 'fast-check', 'allowed'],
    ['shared/src/reasoning/pool/pool.spec.ts', '@weighhouse/server/main', 'refused'],
    // server: the other workspaces
    ['server/src/cases/cases.service.ts', '@weighhouse/shared/contracts/cases', 'allowed'],
    ['server/src/cases/cases.service.ts', 'typeorm', 'allowed'],
    ['server/src/cases/cases.service.ts', 'node:crypto', 'allowed'],
    ['server/src/cases/cases.service.ts', '@weighhouse/db/migrate', 'refused'],
    ['server/src/cases/cases.service.ts', '../../../client/src/lib/api.js', 'refused'],
    // server: the order of the domains
    ['server/src/cases/cases.service.ts', '../people/people.service.js', 'allowed'],
    ['server/src/people/people.service.ts', '../cases/cases.service.js', 'refused'],
    ['server/src/findings/findings.service.ts', '../reports/reports.service.js', 'allowed'],
    ['server/src/reports/reports.service.ts', '../findings/findings.service.js', 'refused'],
    ['server/src/outcomes/outcomes.service.ts', '../people/people.service.js', 'allowed'],
    ['server/src/cases/cases.service.ts', './team/team.service.js', 'allowed'],
    ['server/src/differential/rounds/rounds.service.ts', '../pool/pool.service.js', 'allowed'],
    ['server/src/differential/rounds/rounds.service.ts', '../../plans/plans.service.js', 'refused'],
    ['server/src/cases/cases.service.ts', '../unheard-of/thing.js', 'refused'],
    ['server/src/unheard-of/thing.ts', '../people/people.service.js', 'refused'],
    // server: rows belong to their domain
    ['server/src/people/people.service.ts', './person.entity.js', 'allowed'],
    ['server/src/cases/cases.service.ts', '../people/person.entity.js', 'refused'],
    ['server/src/today/today.service.ts', '../cases/case.entity.js', 'refused'],
    ['server/src/plans/plans.service.ts', '../differential/differential.entities.js', 'refused'],
    // server: platform below, readers above
    ['server/src/platform/http/filter.ts', '../errors/fault.js', 'allowed'],
    ['server/src/platform/http/filter.ts', '../../people/people.service.js', 'refused'],
    ['server/src/people/people.service.ts', '../platform/clock/clock.js', 'allowed'],
    ['server/src/live/live.gateway.ts', '../differential/pool/pool.service.js', 'allowed'],
    ['server/src/differential/pool/pool.service.ts', '../../live/live.gateway.js', 'refused'],
    ['server/src/today/today.service.ts', '../audit/audit.service.js', 'refused'],
    ['server/src/app.module.ts', './live/live.module.js', 'allowed'],
    // client
    ['client/src/features/cases/routes/case.tsx', '../../people/api/get-me', 'allowed'],
    ['client/src/features/cases/routes/case.tsx', '../../people/components/sign-in-form', 'refused'],
    ['client/src/features/cases/routes/case.tsx', '../components/heading', 'allowed'],
    ['client/src/features/cases/routes/case.tsx', '../../../components/page-title', 'allowed'],
    ['client/src/features/cases/routes/case.tsx', '../../../app/router', 'refused'],
    ['client/src/app/router.tsx', '../features/cases/routes/case', 'allowed'],
    ['client/src/components/page-title.tsx', '../features/cases/api/get-case', 'refused'],
    ['client/src/lib/live.ts', '../components/page-title', 'refused'],
    ['client/src/lib/live.ts', '@weighhouse/shared/contracts/live', 'allowed'],
    ['client/src/lib/live.ts', '@weighhouse/server/live/live.gateway', 'refused'],
    ['client/src/lib/live.ts', '../../../server/src/main.js', 'refused'],
    ['client/src/lib/live.ts', 'node:crypto', 'refused'],
    ['client/vite.config.ts', 'node:url', 'allowed'],
    // db and the storage fake
    ['db/src/migrate.ts', '@weighhouse/server/app.module', 'allowed'],
    ['db/src/migrate.ts', '../../client/src/main.js', 'refused'],
    ['storage-fake/src/storage-fake.mjs', '@weighhouse/server/main', 'refused'],
  ])('%s importing %s is %s', (from, specifier, expected) => {
    expect(verdict(from, specifier)).toBe(expected);
  });

  it('names the order when it is broken', () => {
    expect(importFault('server/src/people/a.service', 'server/src/cases/b.service')).toMatch(
      /^people must not import cases\. The order is people, cases, /,
    );
  });
});
