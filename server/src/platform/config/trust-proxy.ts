import { isIP } from 'node:net';

/** Groups of addresses that Express knows by a word. */
const words = new Set(['loopback', 'linklocal', 'uniquelocal']);

/**
 * Which proxies' word is taken for where a request comes from.
 * @param text how many proxies stand in front, or their addresses and networks, separated by commas
 * @returns what Express takes; null for anything else. "true" is refused: whoever sends the header would then choose
 *   the address that attempts at passwords are counted by
 * @source Express 5, "trust proxy"
 */
export function trustedProxies(text: string): number | string[] | null {
  // A number alone would otherwise be read as an address: 1 is 0.0.0.1.
  if (/^\d+$/.test(text)) return Number(text) <= 10 ? Number(text) : null;
  const parts = text.split(',').map((part) => part.trim());
  return parts.every((part) => words.has(part) || isNetwork(part)) ? parts : null;
}

function isNetwork(text: string): boolean {
  const [address = '', bits, ...more] = text.split('/');
  const kind = isIP(address);
  if (kind === 0 || more.length > 0) return false;
  return (
    bits === undefined ||
    (/^\d{1,3}$/.test(bits) && Number(bits) >= 1 && Number(bits) <= (kind === 4 ? 32 : 128))
  );
}
