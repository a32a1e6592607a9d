import { createServer, type AddressInfo, type Server } from 'node:net';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { answers, freePort, requireFreePort } from './ports.mjs';

let server: Server;
let port: number;
beforeEach(async () => {
  server = createServer((socket) => {
    // The one who asks hangs up as soon as it knows enough.
    socket.on('error', () => undefined);
    socket.end('hello');
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  port = (server.address() as AddressInfo).port;
});
afterEach(async () => {
  if (server.listening) await new Promise((resolve) => server.close(resolve));
});

describe('a port for the server', () => {
  it('that is taken is refused by naming the variable to set', async () => {
    await expect(requireFreePort({ host: '127.0.0.1', port })).rejects.toThrow(
      `Port ${port} on 127.0.0.1 is taken by another program. Choose another with the variable PORT, for instance\n  PORT=${port + 1} npm start`,
    );
  });

  it('that is free stays free', async () => {
    const free = await freePort();
    await requireFreePort({ host: '127.0.0.1', port: free });
    await requireFreePort({ host: '127.0.0.1', port: free });
  });

  it('on an address that is not ours is refused by naming HOST', async () => {
    // 192.0.2.0/24 is set aside for documentation (RFC 5737): no machine has it.
    await expect(requireFreePort({ host: '192.0.2.1', port: 4180 })).rejects.toThrow(/Set HOST/);
  });
});

describe('asking whether somebody answers', () => {
  it('says yes to a listener and to the right greeting only', async () => {
    expect(await answers(port)).toBe(true);
    expect(await answers(port, (bytes) => bytes.toString() === 'hello')).toBe(true);
    expect(await answers(port, (bytes) => bytes.toString() === 'other')).toBe(false);
  });

  it('says no where nobody listens', async () => {
    await new Promise((resolve) => server.close(resolve));
    expect(await answers(port)).toBe(false);
  });
});
