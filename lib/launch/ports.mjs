// @ts-check
import net from 'node:net';

/**
 * A port that is free on loopback: the preferred one if it is.
 * @param {number} [preferred]
 * @returns {Promise<number>}
 */
export async function freePort(preferred) {
  if (preferred !== undefined && (await canListen(preferred)) !== null) return preferred;
  const port = await canListen(0);
  if (port === null) throw new Error('No port is free on 127.0.0.1.');
  return port;
}

/**
 * @param {number} port
 * @returns {Promise<number | null>}
 */
function canListen(port) {
  return new Promise((resolve) => {
    const server = net.createServer();
    server.once('error', () => resolve(null));
    server.listen(port, '127.0.0.1', () => {
      const address = server.address();
      server.close(() => resolve(address !== null && typeof address === 'object' ? address.port : null));
    });
  });
}
