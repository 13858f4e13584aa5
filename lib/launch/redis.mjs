// @ts-check
import { mkdirSync } from 'node:fs';
import net from 'node:net';
import path from 'node:path';
import { startChild } from './child.mjs';
import { LaunchProblem } from './run-command.mjs';

/**
 * Starts Redis on loopback with its append-only file in a folder of ours.
 * @param {{ folder: string, port: number }} options
 */
export async function startRedis({ folder, port }) {
  const data = path.join(folder, 'redis');
  mkdirSync(data, { recursive: true });
  const log = path.join(folder, 'redis.log');
  const child = startChild(
    'redis-server',
    [
      '--port',
      String(port),
      '--bind',
      '127.0.0.1',
      '--dir',
      data,
      '--appendonly',
      'yes',
      '--save',
      '',
      '--maxmemory-policy',
      'noeviction',
    ],
    { log, onDeath: 'TERM' },
  );
  const deadline = Date.now() + 30_000;
  while (!(await answersPing(port))) {
    if (!child.running() || Date.now() > deadline) throw new LaunchProblem(`Redis did not start; see ${log}`);
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  return { child, url: `redis://127.0.0.1:${port}` };
}

/**
 * @param {number} port
 * @returns {Promise<boolean>}
 */
function answersPing(port) {
  return new Promise((resolve) => {
    const socket = net.connect(port, '127.0.0.1', () => socket.write('PING\r\n'));
    const answer = (/** @type {boolean} */ good) => {
      socket.destroy();
      resolve(good);
    };
    socket.setTimeout(1000, () => answer(false));
    socket.on('data', (text) => answer(String(text).startsWith('+PONG')));
    socket.on('error', () => answer(false));
  });
}
