// @ts-check
/** The parts of `npm test` in their order; `projects` are those of vitest.config.ts. */
/** @type {Record<string, { commands?: string[][], projects?: string[], needs?: 'services' | 'build' }>} */
export const testParts = {
  types: {
    commands: [
      ['next', 'typegen'],
      ['tsc', '--noEmit'],
    ],
  },
  lint: {
    commands: [
      ['eslint', '.', '--max-warnings', '0'],
      ['prettier', '--check', '.', '--log-level', 'warn'],
    ],
  },
  unit: { projects: ['unit', 'components'] },
  published: { projects: ['published'] },
  integration: { projects: ['integration'], needs: 'services' },
  e2e: { projects: ['e2e'], needs: 'build' },
};
