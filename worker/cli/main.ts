/**
 * The command line: `npm run -s cli -- COMMAND …`. Each command lives in its own file and needs no
 * database. Exit 0 on success, 1 with one line on stderr for bad input; never a stack trace.
 */
const commands: Record<string, () => Promise<{ run: (args: string[]) => Promise<number>; usage: string }>> = {
  read: () => import('./read'),
  geometry: () => import('./geometry'),
  moment: () => import('./moment'),
  plan: () => import('./plan'),
};

async function main(args: string[]): Promise<number> {
  const [name, ...rest] = args;
  const load = name === undefined ? undefined : commands[name];
  if (!load) {
    const list = Object.keys(commands).join(', ');
    process.stderr.write(
      `spinstead: ${name === undefined ? 'no command given' : `no command "${name}"`}; commands: ${list}\n`,
    );
    return 1;
  }
  const command = await load();
  if (rest.includes('--help')) {
    process.stdout.write(`${command.usage}\n`);
    return 0;
  }
  return command.run(rest);
}

// A closed pipe (`| head`) is the reader's choice, not a fault.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code === 'EPIPE') process.exit(0);
  throw error;
});

main(process.argv.slice(2)).then(
  (code) => {
    process.exitCode = code;
  },
  (error: unknown) => {
    process.stderr.write(
      `spinstead: ${error instanceof Error ? error.message.split('\n')[0] : String(error)}\n`,
    );
    process.exitCode = 1;
  },
);
