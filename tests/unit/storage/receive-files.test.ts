import { createHash } from 'node:crypto';
import { gzipSync } from 'node:zlib';
import { pack } from 'tar-stream';
import { describe, expect, it } from 'vitest';
import { zipArchive } from '@/lib/planning/packages/zip-archive';
import { receiveFiles, type ReceivedFile } from '@/lib/storage/receive-files';
import { defaultUploadLimits, type UploadLimits } from '@/lib/storage/upload-limits';

const xyz = '1\nzinc\nZn 0 0 0\n';

async function receive(name: string, bytes: Uint8Array | string, limits: Partial<UploadLimits> = {}) {
  const stored: string[] = [];
  async function* source() {
    const all = Buffer.from(bytes);
    for (let at = 0; at < all.length; at += 1000) yield all.subarray(at, at + 1000);
  }
  const store = async (content: AsyncIterable<Uint8Array>) => {
    const hash = createHash('sha256');
    let size = 0;
    for await (const chunk of content) {
      hash.update(chunk);
      size += chunk.length;
    }
    const sha256 = hash.digest('hex');
    stored.push(sha256);
    return { sha256, bytes: size };
  };
  const files: ReceivedFile[] = [];
  for await (const file of receiveFiles(name, source(), store, { ...defaultUploadLimits, ...limits }))
    files.push(file);
  return { files, stored };
}

const zip = (files: Record<string, string>) =>
  Buffer.from(
    zipArchive(
      Object.entries(files).map(([path, text]) => ({ path, text, executable: false })),
      { year: 2026, month: 12, day: 1, hour: 0, minute: 0 },
    ),
  );

async function tar(
  entries: { name: string; type?: 'file' | 'symlink'; linkname?: string; content?: string }[],
) {
  const archive = pack();
  for (const { content = '', ...header } of entries) archive.entry(header, content);
  archive.finalize();
  const chunks: Uint8Array[] = [];
  for await (const chunk of archive) chunks.push(chunk as Uint8Array);
  return Buffer.concat(chunks);
}

const refusal = (file: ReceivedFile | undefined) => (file && 'refused' in file ? file.refused.code : null);

describe('receiving files', () => {
  it('stores a file under the SHA-256 of its bytes', async () => {
    const { files } = await receive('zinc.xyz', xyz);
    const sha256 = createHash('sha256').update(xyz).digest('hex');
    expect(files).toEqual([{ fileName: 'zinc.xyz', kind: 'xyz', sha256, bytes: xyz.length }]);
  });

  it('opens zip, gz, tar and tar.gz by content, whatever they are called', async () => {
    const inTar = await tar([{ name: 'a/zinc.xyz', content: xyz }]);
    for (const bytes of [zip({ 'a/zinc.xyz': xyz }), inTar, gzipSync(inTar)]) {
      const { files } = await receive('archive.bin', bytes);
      expect(files).toMatchObject([{ fileName: 'a/zinc.xyz', kind: 'xyz' }]);
    }
    expect((await receive('zinc.xyz.gz', gzipSync(xyz))).files).toMatchObject([
      { fileName: 'zinc.xyz', kind: 'xyz' },
    ]);
  });

  it('refuses what it cannot read by name and keeps the rest', async () => {
    const { files, stored } = await receive(
      'mixed.zip',
      zip({ 'a.xyz': xyz, 'notes.txt': 'shopping list', 'b.xyz': xyz, 'empty.out': '' }),
    );
    expect(files.map(refusal)).toEqual([null, 'unknown', null, 'empty']);
    expect(stored).toHaveLength(2);
  });

  it('refuses paths that climb out, absolute paths and links, one by one', async () => {
    const bytes = await tar([
      { name: '../up.xyz', content: xyz },
      { name: '/etc/cron.xyz', content: xyz },
      { name: 'link.xyz', type: 'symlink', linkname: '/etc/passwd' },
      { name: 'good.xyz', content: xyz },
    ]);
    const { files } = await receive('x.tar', bytes);
    expect(files.map(refusal)).toEqual(['unsafe path', 'unsafe path', 'link', null]);
  });

  it('stops a zip bomb before it is unpacked', async () => {
    const bomb = gzipSync(Buffer.alloc(100 * 1024 ** 2, 'Zn 0 0 0\n'));
    const { files, stored } = await receive('bomb.gz', bomb);
    expect(files.map(refusal)).toEqual(['archive bomb']);
    expect(stored).toEqual([]);
  });

  it('refuses a file above the limit and an archive of too many files', async () => {
    expect((await receive('big.xyz', xyz.repeat(1000), { fileBytes: 5000 })).files.map(refusal)).toEqual([
      'too large',
    ]);
    const many = zip({ 'a.xyz': xyz, 'b.xyz': xyz, 'c.xyz': xyz });
    expect((await receive('many.zip', many, { entries: 2 })).files.map(refusal)).toEqual([
      null,
      null,
      'too many files',
    ]);
  });

  it('says that an archive is damaged, and refuses archives in archives', async () => {
    const cut = gzipSync(xyz.repeat(500)).subarray(0, 40);
    expect((await receive('cut.gz', cut)).files.map(refusal)).toEqual(['damaged archive']);
    expect((await receive('cut.zip', zip({ 'a.xyz': xyz }).subarray(0, 60))).files.map(refusal)).toEqual([
      'damaged archive',
    ]);
    const nested = await tar([{ name: 'inner.zip', content: zip({ 'a.xyz': xyz }).toString('latin1') }]);
    expect((await receive('outer.tar', nested)).files.map(refusal)).toEqual(['nested archive']);
  });
});
