// @ts-check
import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { freePort } from './ports.mjs';

/**
 * A JSON note in the data folder, readable by its owner only.
 * @template T
 * @param {string} file
 * @param {() => T | Promise<T>} make - called when there is no note yet
 * @returns {Promise<T>}
 */
async function remember(file, make) {
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));
  const value = await make();
  mkdirSync(path.dirname(file), { recursive: true });
  writeFileSync(file, JSON.stringify(value, null, 2), { mode: 0o600 });
  return value;
}

/**
 * Secrets of this installation, made on the first start.
 * @param {string} folder
 */
export function secrets(folder) {
  const secret = () => randomBytes(32).toString('base64url');
  return remember(path.join(folder, 'secrets.json'), () => ({
    nextauth: secret(),
    ownerPassword: secret(),
    appPassword: secret(),
  }));
}

/**
 * Ports of the services, chosen on the first start and kept; one that somebody else has taken since is chosen anew.
 * @param {string} folder
 */
export async function ports(folder) {
  const file = path.join(folder, 'ports.json');
  const preferred = existsSync(file)
    ? JSON.parse(readFileSync(file, 'utf8'))
    : { web: 4310, postgres: 5471, redis: 6471, mail: 2571 };
  /** @type {{ web: number, postgres: number, redis: number, mail: number }} */
  const chosen = { web: 0, postgres: 0, redis: 0, mail: 0 };
  for (const name of /** @type {const} */ (['web', 'postgres', 'redis', 'mail'])) {
    chosen[name] = await freePort(Number(preferred[name]));
  }
  writeFileSync(file, JSON.stringify(chosen, null, 2));
  return chosen;
}
