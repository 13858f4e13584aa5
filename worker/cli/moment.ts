export const usage = 'Usage: npm run -s cli -- moment FILE…';

export async function run(_args: string[]): Promise<number> {
  throw new Error('moment is being written');
}
