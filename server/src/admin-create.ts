import 'reflect-metadata';
import { parseArgs } from 'node:util';
import { DataSource } from 'typeorm';
import { entities } from './entities.js';
import { addAdministrator, firstAdministratorSchema } from './people/first-administrator.js';
import { invitationLink } from './people/issue-invitation.js';
import { PersonRegister } from './people/person-register.js';
import { AuditLog } from './platform/audit-log/audit-log.js';
import { Clock } from './platform/clock/clock.js';
import { readConfiguration } from './platform/config/configuration.js';
import { databaseOptions } from './platform/database/database-options.js';

const usage = 'npm run admin:create -- --email you@hospital.example --name "Your Name" [--centre "Centre"]';

/** Makes an administrator from the command line. @returns the single-use link */
async function createAdministrator(args: string[]): Promise<string> {
  const input = readArguments(args);
  const configuration = readConfiguration(process.env);
  const clock = new Clock();
  const register = new PersonRegister(clock, new AuditLog(clock));
  const source = await new DataSource(databaseOptions(configuration.DATABASE_URL, entities)).initialize();
  try {
    const token = await source.transaction((em) => addAdministrator(em, register, input, clock.now()));
    return invitationLink(configuration.PUBLIC_URL, token);
  } finally {
    await source.destroy();
  }
}

function readArguments(args: string[]): ReturnType<typeof firstAdministratorSchema.parse> {
  const text = { type: 'string' } as const;
  const { values } = parseArgs({ args, options: { email: text, name: text, centre: text } });
  const result = firstAdministratorSchema.safeParse(values);
  if (result.success) return result.data;
  const faults = result.error.issues.map((issue) => `--${issue.path.join('.')} ${issue.message}`);
  throw new Error(`${faults.join('\n')}\nUsage: ${usage}`);
}

try {
  const link = await createAdministrator(process.argv.slice(2));
  process.stderr.write('Open this link to set the password. It works once and for seven days:\n');
  process.stdout.write(`${link}\n`);
} catch (error) {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
}
