import { Redis } from 'ioredis';

/** A connection as BullMQ wants it: it waits for Redis to come back instead of failing commands. */
export function openRedis(url: string): Redis {
  return new Redis(url, { maxRetriesPerRequest: null, enableReadyCheck: true });
}

/** Redis of the environment: queue, wake-ups and progress. PostgreSQL holds the truth. */
export function redisUrl(): string {
  const url = process.env.REDIS_URL;
  if (!url) throw new Error('REDIS_URL is not set: give the address of Redis.');
  return url;
}
