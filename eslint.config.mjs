import next from 'eslint-config-next';
import nextTypescript from 'eslint-config-next/typescript';

const pureRooms = ['chemistry', 'outputs', 'structures', 'geometry', 'magnetism', 'planning', 'comparison'];
/** Which other pure rooms each pure room may import from. */
const mayUse = {
  chemistry: [],
  outputs: ['chemistry'],
  structures: ['chemistry'],
  geometry: ['chemistry'],
  magnetism: ['chemistry'],
  planning: pureRooms.filter((room) => room !== 'comparison'),
  comparison: pureRooms.filter((room) => room !== 'planning'),
};
const outerRooms = ['access', 'storage', 'mail', 'queue', 'config', 'launch'];

const pureZones = pureRooms.flatMap((room) => [
  {
    target: `./lib/${room}`,
    from: pureRooms
      .filter((other) => other !== room && !mayUse[room].includes(other))
      .map((other) => `./lib/${other}`),
    message: `lib/${room} may use only: ${mayUse[room].join(', ') || 'nothing'}.`,
  },
  {
    target: `./lib/${room}`,
    from: ['./app', './components', './db', './worker', ...outerRooms.map((outer) => `./lib/${outer}`)],
    message: 'Pure rooms import no screen, query, process or adapter.',
  },
]);

const outsideWorld = ['next', 'next/*', 'react', 'react-dom', 'knex', 'pg', 'ioredis', 'bullmq', 'pino'];

const config = [
  { ignores: ['.next/**', '.build/**', '.data/**', 'node_modules/**', 'next-env.d.ts', 'public/**'] },
  ...next,
  ...nextTypescript,
  {
    rules: {
      'import/no-cycle': ['error', { ignoreExternal: true, maxDepth: 6 }],
      'import/no-restricted-paths': [
        'error',
        {
          zones: [
            ...pureZones,
            {
              target: './components',
              from: ['./app', './db', './worker'],
              message: 'Components take data as props.',
            },
            {
              target: './lib',
              from: ['./app', './components', './worker'],
              message: 'lib imports no screen and no process.',
            },
            { target: './lib', from: './db', except: [], message: 'lib imports no query.' },
            { target: './db', from: ['./app', './components', './worker'], message: 'db imports only lib.' },
            { target: './worker', from: ['./app', './components'], message: 'The worker draws no screens.' },
          ],
        },
      ],
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      'no-console': ['error', { allow: ['error'] }],
    },
  },
  {
    files: pureRooms.map((room) => `lib/${room}/**/*.ts`),
    rules: {
      'no-restricted-imports': [
        'error',
        { paths: outsideWorld, patterns: ['node:*', 'next/*', '@aws-sdk/*'] },
      ],
      'no-restricted-globals': ['error', 'process', 'Buffer', 'window', 'document'],
    },
  },
  { files: ['worker/**', 'lib/launch/**', 'tests/**'], rules: { 'no-console': 'off' } },
];
export default config;
