export const usage = 'Usage: npm run -s cli -- geometry FILE…';

export async function run(_args: string[]): Promise<number> {
  throw new Error('geometry is being written');
}
