import { isIP } from 'node:net';

const mapped = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/i;

/**
 * What attempts from an address are counted by: the address itself, or of IPv6 its network of 64 bits, because a
 * subscriber is given at least such a network and may take a new address in it for every attempt.
 * @source RFC 4291 section 2.5.4 (interface identifiers of 64 bits), RFC 6177 (what sites are given)
 * @example networkOf('2001:db8:0:1::7') is "2001:db8:0:1::/64"; networkOf('::ffff:192.0.2.7') is "192.0.2.7"
 */
export function networkOf(address: string): string {
  const plain = address.replace(/%.*$/, '');
  const inside = mapped.exec(plain)?.[1];
  if (inside !== undefined) return inside;
  if (isIP(plain) !== 6) return plain;
  const [before = '', after] = plain.split('::');
  const groups = before === '' ? [] : before.split(':');
  const last = after === undefined || after === '' ? [] : after.split(':');
  // An IPv4 address at the end takes the room of two groups.
  const taken = groups.length + last.length + (plain.includes('.') ? 1 : 0);
  const zeros = Array.from({ length: 8 - taken }, () => '0');
  const network = [...groups, ...zeros, ...last].slice(0, 4);
  return `${network.map((group) => Number.parseInt(group, 16).toString(16)).join(':')}::/64`;
}
