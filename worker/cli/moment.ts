import { readFile } from 'node:fs/promises';
import { z } from 'zod';
import { momentFromReadings } from '../../lib/magnetism/moment-from-readings';
import { momentInputSchema } from '../../lib/magnetism/moment-schema';

export const usage = [
  'Usage: npm run -s cli -- moment FILE.json',
  '',
  'Works readings out to a moment and a number of unpaired electrons. Prints one JSON object: chiG (cm³/g), chiM and',
  'chiMCorrected (cm³/mol, cgs-emu), muEff ± muEffU (μ_B, standard uncertainty), unpaired ± unpairedU, steps, budget,',
  'warnings. What is not part of a chain is null.',
  '',
  'FILE.json holds { "technique", "readings", "sample" }. Every quantity is a number, { "value", "u" } with its standard',
  'uncertainty, or { "replicates": [...], "u" }. Exactly one of temperatureKelvin and temperatureCelsius. For example:',
  '',
  JSON.stringify(
    {
      technique: 'susceptibility balance',
      readings: {
        balanceConstant: { value: 1.089, u: 0.005 },
        lengthCentimetre: { value: 2.1, u: 0.02 },
        reading: 592,
        readingEmpty: -28,
        massGram: { value: 0.238, u: 0.0002 },
      },
      sample: {
        formula: 'CuSO4·5H2O',
        temperatureKelvin: 293,
        diamagnetism: {
          method: 'pascal',
          parts: [
            { table: 'cations', name: 'Cu2+', count: 1 },
            { table: 'anions', name: 'SO4^2-', count: 1 },
            { table: 'ligands', name: 'H2O', count: 5 },
          ],
        },
      },
    },
    null,
    2,
  ),
  '',
  'Schema of the file (JSON Schema):',
  JSON.stringify(z.toJSONSchema(momentInputSchema, { unrepresentable: 'any', io: 'input' })),
].join('\n');

export async function run(args: string[]): Promise<number> {
  const [file, ...more] = args;
  if (file === undefined || more.length > 0) return fail('give one JSON file; --help shows its schema');
  let text: string;
  try {
    text = await readFile(file, 'utf8');
  } catch (error) {
    if (!(error instanceof Error) || !('code' in error)) throw error;
    return fail(
      `${file}: ${error.code === 'ENOENT' ? 'there is no such file' : `cannot be opened (${String(error.code)})`}`,
    );
  }
  let json: unknown;
  try {
    json = JSON.parse(text);
  } catch (error) {
    return fail(
      `${file}: is no JSON (${error instanceof Error ? error.message.split('\n')[0] : 'unreadable'})`,
    );
  }
  const input = momentInputSchema.safeParse(json);
  if (!input.success) {
    const issue = input.error.issues[0];
    return fail(`${file}: ${issue?.path.join('.') || 'the file'}: ${issue?.message ?? 'cannot be used'}`);
  }
  const result = momentFromReadings(input.data);
  if (!result.ok) return fail(`${file}: ${result.error.field}: ${result.error.message}`);
  const { calculation, warnings, ...values } = result.value;
  const budget = calculation.budget('muEff');
  process.stdout.write(`${JSON.stringify({ ...values, steps: calculation.steps, budget, warnings })}\n`);
  return 0;
}

function fail(message: string): number {
  process.stderr.write(`spinstead: ${message.replace(/\s*\n\s*/g, ' ')}\n`);
  return 1;
}
