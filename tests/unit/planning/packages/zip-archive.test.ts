import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import yauzl from 'yauzl';
import { crc32 } from '@/lib/planning/packages/crc32';
import { zipArchive } from '@/lib/planning/packages/zip-archive';

const files = [
  { path: 'SP1234567W-a/job.sh', text: '#!/bin/bash\nexit 0\n', executable: true },
  { path: 'manifest.csv', text: 'ä,²⁺\r\n', executable: false },
];
const archive = zipArchive(files, { year: 2026, month: 12, day: 1, hour: 7, minute: 30 });

/** Names, modes and texts as an independent reader finds them. */
function unzip(bytes: Uint8Array): Promise<{ name: string; mode: number; text: string; date: string }[]> {
  return new Promise((resolve, reject) => {
    yauzl.fromBuffer(Buffer.from(bytes), { lazyEntries: true, validateEntrySizes: true }, (error, zip) => {
      if (error) return reject(error);
      const found: { name: string; mode: number; text: string; date: string }[] = [];
      zip.on('error', reject);
      zip.on('end', () => resolve(found));
      zip.on('entry', (entry: yauzl.Entry) => {
        zip.openReadStream(entry, (failure, stream) => {
          if (failure) return reject(failure);
          const parts: Buffer[] = [];
          stream.on('data', (part: Buffer) => parts.push(part));
          stream.on('end', () => {
            const text = Buffer.concat(parts).toString('utf8');
            const date = `${(entry.lastModFileDate >> 9) + 1980}-${(entry.lastModFileDate >> 5) & 15}`;
            found.push({
              name: entry.fileName,
              mode: (entry.externalFileAttributes >>> 16) & 0o777,
              text,
              date,
            });
            zip.readEntry();
          });
        });
      });
      zip.readEntry();
    });
  });
}

describe('a zip archive', () => {
  it('is read back by another library with names, texts, dates and permissions', async () => {
    expect(await unzip(archive)).toEqual([
      { name: 'SP1234567W-a/job.sh', mode: 0o755, text: '#!/bin/bash\nexit 0\n', date: '2026-12' },
      { name: 'manifest.csv', mode: 0o644, text: 'ä,²⁺\r\n', date: '2026-12' },
    ]);
  });

  it.skipIf(spawnSync('which', ['python3']).status !== 0)(
    'passes the integrity test of Python’s zipfile',
    () => {
      const folder = mkdtempSync(path.join(tmpdir(), 'zip-'));
      try {
        writeFileSync(path.join(folder, 'a.zip'), archive);
        const check = spawnSync('python3', ['-m', 'zipfile', '-t', path.join(folder, 'a.zip')], {
          encoding: 'utf8',
        });
        expect([check.status, check.stdout.trim()]).toEqual([0, 'Done testing']);
      } finally {
        rmSync(folder, { recursive: true, force: true });
      }
    },
  );

  // Check value of CRC-32/ISO-HDLC in the usual catalogues of CRC parameters.
  it('has the standard check sum of "123456789"', () => {
    expect(crc32(new TextEncoder().encode('123456789'))).toBe(0xcbf43926);
  });
});
