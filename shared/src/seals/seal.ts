import canonicalize from 'canonicalize';
import type { SealedDocument } from '../contracts/rounds.js';

/** Bytes of randomness in front of the sealed text. */
export const randomLength = 32;

/**
 * The text that a seal closes over: the document in canonical JSON.
 * @source RFC 8785, JSON Canonicalization Scheme
 */
export function canonicalText(document: SealedDocument): string {
  const text = canonicalize(document);
  if (text === undefined) throw new TypeError('a sealed document must be a JSON value');
  return text;
}

/**
 * The seal's digest: SHA-256 (FIPS 180-4) over the random bytes followed by the canonical text in UTF-8.
 * @param random 32 bytes, secret until the round is unsealed
 * @returns 64 hexadecimal digits
 * @throws RangeError when `random` has another length
 */
export async function sealDigest(random: Uint8Array, document: SealedDocument): Promise<string> {
  if (random.length !== randomLength)
    throw new RangeError(`a seal takes ${String(randomLength)} random bytes`);
  const text = new TextEncoder().encode(canonicalText(document));
  const sealed = new Uint8Array(random.length + text.length);
  sealed.set(random, 0);
  sealed.set(text, random.length);
  return toHex(new Uint8Array(await globalThis.crypto.subtle.digest('SHA-256', sealed)));
}

/** Whether a published seal is the one that was shown at hand-in. */
export async function sealHolds(seal: {
  digest: string;
  random: string;
  document: SealedDocument;
}): Promise<boolean> {
  return (await sealDigest(fromHex(seal.random), seal.document)) === seal.digest.toLowerCase();
}

/** Bytes as lower-case hexadecimal digits. */
export function toHex(bytes: Uint8Array): string {
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
}

/** @throws RangeError when the text is not hexadecimal digits in pairs */
export function fromHex(text: string): Uint8Array {
  if (!/^([0-9a-f]{2})*$/i.test(text)) throw new RangeError('must be hexadecimal digits in pairs');
  return Uint8Array.from(text.match(/../g) ?? [], (pair) => Number.parseInt(pair, 16));
}
