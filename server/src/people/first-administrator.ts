import { emailSchema } from '@weighhouse/shared/contracts/people';
import { lineSchema } from '@weighhouse/shared/contracts/common';
import type { EntityManager } from 'typeorm';
import { z } from 'zod';
import { CentreRow } from './centre.entity.js';
import { insertCentre } from './centres.service.js';
import type { PersonRegister } from './person-register.js';

/** What the command line gives. */
export const firstAdministratorSchema = z.object({
  email: emailSchema,
  name: lineSchema(120),
  /** The code or the name of a centre; made when there is none like it. */
  centre: lineSchema(120).optional(),
});
export type FirstAdministrator = z.infer<typeof firstAdministratorSchema>;

const specialty = 'Administration';

/**
 * Adds an administrator from the command line.
 * @returns the token of the single-use link
 * @throws Refusal duplicate when the e-mail is taken
 */
export async function addAdministrator(
  em: EntityManager,
  register: PersonRegister,
  input: FirstAdministrator,
  now: Date,
): Promise<string> {
  const centreId = await centreFor(em, input.centre, now);
  const { token } = await register.add(
    em,
    { email: input.email, name: input.name, specialty, centreId, roles: ['administrator'] },
    null,
  );
  return token;
}

async function centreFor(em: EntityManager, named: string | undefined, now: Date): Promise<string> {
  const centres = await em.find(CentreRow, { order: { createdAt: 'ASC' } });
  const wanted = named?.toLowerCase();
  const found = centres.find(
    (centre) =>
      wanted === undefined || [centre.code, centre.name].some((text) => text.toLowerCase() === wanted),
  );
  if (found) return found.id;
  const name = named ?? 'Main centre';
  const made = await insertCentre(
    em,
    {
      code: codeFor(
        name,
        centres.map((centre) => centre.code),
      ),
      name,
    },
    now,
  );
  return made.id;
}

/** A short name from the initials of the long one, with a figure where it is taken. */
export function codeFor(name: string, taken: readonly string[]): string {
  const words = name.toUpperCase().match(/[\p{L}\p{N}]+/gu) ?? [];
  const initials =
    words.length > 1 ? words.map((word) => Array.from(word)[0]).join('') : (words[0] ?? 'CENTRE');
  const code = Array.from(initials).slice(0, 6).join('');
  const isTaken = (text: string) => taken.some((other) => other.toUpperCase() === text);
  if (!isTaken(code)) return code;
  for (let figure = 2; ; figure += 1) {
    if (!isTaken(`${code}${String(figure)}`)) return `${code}${String(figure)}`;
  }
}
