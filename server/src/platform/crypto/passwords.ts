import argon2 from 'argon2';

/** Argon2id with the first recommended setting for memory-constrained servers: RFC 9106, section 4 (64 MiB, 3 passes). */
const setting = { type: argon2.argon2id, memoryCost: 65536, timeCost: 3, parallelism: 4 } as const;

export const hashPassword = (password: string): Promise<string> => argon2.hash(password, setting);

let decoy: Promise<string> | undefined;

/** Checks a password. Without a hash it takes as long and answers no, so that time tells nobody who exists. */
export async function passwordMatches(hash: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword('nobody has this password');
  const matches = await argon2.verify(hash ?? (await decoy), password);
  return matches && hash !== null;
}
