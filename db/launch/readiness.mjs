/**
 * Whether the server at this address says that it and what it needs are ready.
 *
 * @param {{ host: string, port: number }} address
 * @returns {Promise<boolean>}
 */
export async function isReady({ host, port }) {
  const reachable = host === '0.0.0.0' ? '127.0.0.1' : host === '::' ? '[::1]' : host;
  try {
    const response = await fetch(`http://${reachable}:${port}/api/ready`, {
      signal: AbortSignal.timeout(5_000),
    });
    return response.status === 200;
  } catch {
    return false;
  }
}
