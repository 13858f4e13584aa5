'use client';
import { useSyncExternalStore } from 'react';

const never = () => () => undefined;

/** A moment in the viewer's zone, the exact UTC on hover; the server, which knows no zone, writes UTC. */
export function LocalTime({ iso }: { iso: string }) {
  const inBrowser = useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
  const utc = `${iso.slice(0, 10)} ${iso.slice(11, 16)} UTC`;
  const shown = inBrowser
    ? new Date(iso).toLocaleString('en-GB', { dateStyle: 'medium', timeStyle: 'short' })
    : utc;
  return (
    <time dateTime={iso} title={`${iso.slice(0, 10)} ${iso.slice(11, 19)} UTC`} className="whitespace-nowrap">
      {shown}
    </time>
  );
}
