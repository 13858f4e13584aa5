import type { Redis } from 'ioredis';
import { openRedis, redisUrl } from './connection';

let publisher: Redis | undefined;

function channel(groupId: string, studyId: string): string {
  return `progress:${groupId}:${studyId}`;
}

/** Says that something about the study's uploads changed; whoever listens looks in the database what it is. */
export async function publishProgress(groupId: string, studyId: string): Promise<void> {
  publisher ??= openRedis(redisUrl());
  await publisher.publish(channel(groupId, studyId), '1');
}

/** Calls back at every change of the study's uploads until `stop` is called. */
export async function listenToProgress(
  groupId: string,
  studyId: string,
  onChange: () => void,
): Promise<{ stop: () => void }> {
  const subscriber = openRedis(redisUrl());
  subscriber.on('message', onChange);
  await subscriber.subscribe(channel(groupId, studyId));
  return { stop: () => subscriber.disconnect() };
}

export async function closeProgress(): Promise<void> {
  await publisher?.quit();
  publisher = undefined;
}
