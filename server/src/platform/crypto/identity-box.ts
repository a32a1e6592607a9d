import { createCipheriv, createDecipheriv, randomBytes } from 'node:crypto';

const algorithm = 'aes-256-gcm';
const nonceLength = 12;
const tagLength = 16;

/**
 * Encrypts a text with AES-256-GCM (NIST SP 800-38D).
 * @param key 32 bytes
 * @param boundTo what the text belongs to; a box moved to another record does not open
 * @returns nonce (12 bytes), tag (16 bytes) and ciphertext, in this order
 */
export function closeBox(key: Buffer, text: string, boundTo: string): Buffer {
  const nonce = randomBytes(nonceLength);
  const cipher = createCipheriv(algorithm, key, nonce);
  cipher.setAAD(Buffer.from(boundTo, 'utf8'));
  const sealed = Buffer.concat([cipher.update(text, 'utf8'), cipher.final()]);
  return Buffer.concat([nonce, cipher.getAuthTag(), sealed]);
}

/** @throws Error when the key is another, the box was changed, or it belongs to something else */
export function openBox(key: Buffer, box: Buffer, boundTo: string): string {
  // With its length said, a tag that was cut short is refused rather than checked in part.
  const decipher = createDecipheriv(algorithm, key, box.subarray(0, nonceLength), {
    authTagLength: tagLength,
  });
  decipher.setAAD(Buffer.from(boundTo, 'utf8'));
  decipher.setAuthTag(box.subarray(nonceLength, nonceLength + tagLength));
  const sealed = box.subarray(nonceLength + tagLength);
  return Buffer.concat([decipher.update(sealed), decipher.final()]).toString('utf8');
}
