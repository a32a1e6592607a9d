import { createHash, randomBytes, randomUUID } from 'node:crypto';
import { type EntityManager, IsNull } from 'typeorm';
import { InvitationRow } from './invitation.entity.js';

const lifeMs = 7 * 24 * 3_600_000;

/** What is kept of a link's token: SHA-256, hexadecimal. The token has 256 random bits, so it needs no salt. */
export const hashOfToken = (token: string): string => createHash('sha256').update(token).digest('hex');

/**
 * Makes a person's single-use link, good for seven days; earlier ones stop working.
 * @returns the token, which is kept nowhere
 */
export async function issueInvitation(em: EntityManager, personId: string, now: Date): Promise<string> {
  await withdrawInvitations(em, personId, now);
  const token = randomBytes(32).toString('base64url');
  await em.insert(InvitationRow, {
    id: randomUUID(),
    personId,
    tokenHash: hashOfToken(token),
    createdAt: now,
    expiresAt: new Date(now.getTime() + lifeMs),
    usedAt: null,
    withdrawnAt: null,
  });
  return token;
}

export async function withdrawInvitations(em: EntityManager, personId: string, now: Date): Promise<void> {
  await em.update(InvitationRow, { personId, usedAt: IsNull(), withdrawnAt: IsNull() }, { withdrawnAt: now });
}

/** The page that an invitation's link opens. */
export const invitationLink = (publicUrl: string, token: string): string =>
  `${publicUrl}/invitation/${token}`;
