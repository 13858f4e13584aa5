export const usage = 'Usage: npm run -s cli -- read FILE…';

export async function run(_args: string[]): Promise<number> {
  throw new Error('read is being written');
}
