import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { gunzipSync, gzipSync } from 'node:zlib';
import { pack } from 'tar-stream';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { zipArchive } from '@/lib/planning/packages/zip-archive';
import { openBrowser, pageOf } from './support/browser';
import { startApplication, type RunningApplication } from './support/running-application';

/**
 * Calculated values are held against the demo's truth table and its independently calculated geometry
 * (../shared/demo), which may be committed: the same outputs lie gzipped under public/demo.
 */
const outputs = path.resolve('public/demo');
const truth = path.resolve('../shared/demo/truth.json');
const geometry = path.resolve('../shared/demo/geometry.json');

interface Truth {
  file: string;
  charge: number;
  multiplicity: number;
  lastEnergyHartree: number;
  s2: number;
}
interface Sphere {
  file: string;
  meanDistanceAngstrom: number;
  baurDistortion: number;
  tau4: number;
}

let application: RunningApplication;
let browser: Browser;

beforeAll(async () => {
  application = await startApplication();
  browser = await openBrowser();
});
afterAll(async () => {
  await browser?.close();
  await application?.stop();
});

const six = ['mncl4_m6', 'fecl4_m5', 'cocl4_m4', 'nicl4_m3', 'cucl4_m2', 'zncl4_m1'];

function demoOutput(name: string): { name: string; mimeType: string; buffer: Buffer } {
  return {
    name: `${name}.out.gz`,
    mimeType: 'application/gzip',
    buffer: readFileSync(path.join(outputs, `nwchem-${name}.out.gz`)),
  };
}

const text = (name: string, content: string | Buffer) => ({
  name,
  mimeType: 'application/octet-stream',
  buffer: Buffer.from(content),
});

/** A zip whose entry climbs out: no tool writes one, so the name is changed in the finished bytes. */
function climbingZip(): Buffer {
  const zip = zipArchive([{ path: 'xx/climbing.out', text: 'text', executable: false }], {
    year: 2026,
    month: 12,
    day: 1,
    hour: 0,
    minute: 0,
  });
  return Buffer.from(
    Buffer.from(zip).toString('latin1').replaceAll('xx/climbing.out', '../climbing.out'),
    'latin1',
  );
}

async function tarOf(name: string, content: string): Promise<Buffer> {
  const archive = pack();
  archive.entry({ name }, content);
  archive.finalize();
  const chunks: Uint8Array[] = [];
  for await (const chunk of archive) chunks.push(chunk as Uint8Array);
  return Buffer.concat(chunks);
}

async function newStudy(page: Page): Promise<string> {
  await page.goto('/studies/new');
  await page.getByLabel('Title').fill('Chlorides by browser');
  await page.getByRole('button', { name: 'Create the study' }).click();
  await page.waitForURL((address) => /^\/studies\/[0-9a-f-]{36}$/.test(address.pathname));
  const study = new URL(page.url()).pathname;
  await page.goto(`${study}/complexes/new`);
  await page.getByLabel('Formula with charge').fill('[CoCl4]2-');
  await page.getByRole('button', { name: 'Add the complex' }).click();
  await page.waitForURL((address) => /complexes\/[0-9a-f-]{36}$/.test(address.pathname));
  return study;
}

async function cell(page: Page, head: string): Promise<number> {
  const row = page.getByRole('row').filter({ has: page.getByRole('rowheader', { name: head, exact: true }) });
  const words = await row.getByRole('cell').first().innerText();
  return Number(words.replace('−', '-').replace(/[\s\u2009\u202f\u00a0]/g, ''));
}

describe.skipIf(!existsSync(truth))('the main job', () => {
  it('goes from dropped outputs to calculated beside measured', async () => {
    const chemist = await pageOf(browser, application.url, 'computational chemist');
    const study = await newStudy(chemist.page);
    const complex = new URL(chemist.page.url()).pathname;

    await chemist.page.goto(`${study}/runs`);
    await chemist.page
      .getByLabel('Files to upload')
      .setInputFiles([
        ...six.map(demoOutput),
        text('water.xyz', '3\nwater\nO 0 0 0.117\nH 0 0.757 -0.471\nH 0 -0.757 -0.471\n'),
      ]);
    await chemist.page.getByText('7 read · 0 failed · 0 refused').waitFor({ timeout: 60_000 });
    expect(chemist.errors).toEqual([]);

    const experimentalist = await pageOf(browser, application.url, 'experimentalist');
    const { page } = experimentalist;
    await page.goto(`${complex}/measure`);
    await page.getByLabel('Sample').fill('Co-1');
    await page.getByLabel('Temperature', { exact: true }).fill('295.2');
    await page.getByLabel('Effective moments of the replicates').fill('4,62\n4.64\n4.66');
    await page.getByLabel('Standard uncertainty that repeats do not show').fill('0.02');
    await page.getByLabel('Measured on').fill('2026-11-20');
    await page.getByRole('button', { name: 'Save the measurement' }).click();
    await page.waitForURL((address) => address.pathname === complex);

    const wanted = read<Truth>(truth, 'nwchem/cocl4_m4.out');
    const sphere = read<Sphere>(geometry, 'nwchem/cocl4_m4.out');
    expect(await cell(page, 'Multiplicity')).toBe(wanted.multiplicity);
    expect(await cell(page, 'Energy, Eh')).toBeCloseTo(wanted.lastEnergyHartree, 6);
    expect(await cell(page, '⟨S²⟩')).toBeCloseTo(wanted.s2, 4);
    // Mulliken spin of Co as the last table of the output prints it: 2.83.
    expect(await cell(page, 'Spin population of the metal, Mulliken')).toBe(2.83);
    expect(await cell(page, 'Mean M–L distance, Å')).toBeCloseTo(sphere.meanDistanceAngstrom, 3);
    expect(await cell(page, 'Baur distortion D')).toBeCloseTo(sphere.baurDistortion, 4);
    // The truth table divides by 141.06°, the page by the published 141°: a factor of 1.0004.
    expect(Math.abs((await cell(page, 'τ₄')) - sphere.tau4)).toBeLessThan(1e-3);

    // By hand: mean 4.64; s = 0.02, s/√3 = 0.01155; u = √(0.01155² + 0.02²) = 0.0231, U = 0.046;
    // n = √(1 + 4.64²) − 1 = 3.747, u(n) = 4.64/4.747 × 0.0231 = 0.0226.
    const stated = (await page.getByTestId('stated-moment').innerText()).replace(/\s+/g, ' ');
    expect(stated).toMatch(/4\.64\d? ± 0\.0(5|46)/);
    const worked = (await page.locator('main').innerText()).replace(/[\s\u2009\u202f\u00a0]+/g, ' ');
    expect(worked).toMatch(/3\.7(47|5) ± 0\.02(3)?/);
    expect(await page.getByTestId('agreement').innerText()).toContain('agree');
    await page.getByText('consistent').first().waitFor();
    expect(experimentalist.errors).toEqual([]);

    const guest = await pageOf(browser, application.url, 'guest');
    await guest.page.goto(complex);
    await guest.page.getByText('Calculation and measurement agree').waitFor();
    expect(await guest.page.getByRole('link', { name: 'Enter a measurement' }).count()).toBe(0);
    expect((await guest.page.goto(`${complex}/measure`))?.status()).toBe(403);
    const put = await guest.page.request.put(
      `/api/v1${study}/uploads?name=a.out&drop=${crypto.randomUUID()}`,
      {
        data: 'x',
        headers: { origin: application.url },
      },
    );
    expect(put.status()).toBe(403);
  });

  it('names each bad file of a drop and reads the good one', async () => {
    const { page, errors } = await pageOf(browser, application.url, 'computational chemist');
    const study = await newStudy(page);
    await page.goto(`${study}/runs`);
    const whole = gunzipSync(demoOutput('mncl4_m6').buffer);
    await page
      .getByLabel('Files to upload')
      .setInputFiles([
        demoOutput('zncl4_m1'),
        text('cut.out', whole.subarray(0, Math.floor(whole.length / 2))),
        text(
          'binary.out',
          Buffer.from(Uint8Array.from({ length: 5000 }, (_each, index) => (index * 37) % 256)),
        ),
        text('empty.out', ''),
        text('none.xyz', '0\nnothing\n'),
        text('wrong.xyz', '4\nwater\nO 0 0 0.117\nH 0 0.757 -0.471\nH 0 -0.757 -0.471\n'),
        text('climbing.zip', climbingZip()),
        text('climbing.tar.gz', gzipSync(await tarOf('../from-tar.out', 'text'))),
      ]);
    await page.getByText('2 read · 2 failed · 4 refused').waitFor({ timeout: 60_000 });
    const row = async (name: string) =>
      (await page.getByRole('row').filter({ hasText: name }).first().innerText()).replace(/\s+/g, ' ');
    expect(await row('zncl4_m1.out')).toContain('read');
    expect(await row('cut.out')).toMatch(/cut off.*line \d+/i);
    expect(await row('binary.out')).toMatch(/refused.*binary/);
    expect(await row('empty.out')).toMatch(/refused.*empty/);
    expect(await row('none.xyz')).toMatch(/failed.*Line 1/);
    expect(await row('wrong.xyz')).toMatch(/failed.*Line \d/);
    expect(await row('climbing.out')).toMatch(/refused.*"\.\."/);
    expect(await row('from-tar.out')).toMatch(/refused.*"\.\."/);
    expect(errors).toEqual([]);
  });

  it('tells the demo’s story: two broken marks, no others', async () => {
    const { page } = await pageOf(browser, application.url, 'PI');
    await page.getByRole('link', { name: 'Indicator inks: dry and damp salts' }).click();
    await page.getByText('2 broken', { exact: false }).first().waitFor();
    const rows = await page
      .getByRole('row')
      .evaluateAll((all) =>
        all.map((each) => `${each.innerHTML.includes('broken: ') ? 'broken' : ''} ${each.textContent ?? ''}`),
      );
    const names = rows.filter((words) => words.startsWith('broken')).map((words) => words.slice(0, 24));
    expect(names).toHaveLength(2);
    expect(names.join(' ')).toMatch(/Ni.*Fe/);
    await page
      .getByText('every measured value are invented')
      .or(page.getByText('invented'))
      .first()
      .waitFor();
  });
});

function read<T extends { file: string }>(file: string, name: string): T {
  const found = (JSON.parse(readFileSync(file, 'utf8')) as T[]).find((each) => each.file === name);
  if (!found) throw new Error(`${file} has no ${name}`);
  return found;
}
