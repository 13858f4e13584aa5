export const usage = 'Usage: npm run -s cli -- plan FILE…';

export async function run(_args: string[]): Promise<number> {
  throw new Error('plan is being written');
}
