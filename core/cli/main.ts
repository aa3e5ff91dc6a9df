/**
 * Where the command line meets the process; the only file of the core that does.
 */
import { readFile, stat, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import type { Io } from './io';
import { run } from './run';

const io: Io = {
  cwd: process.cwd(),
  env: process.env,
  isTerminal: process.stdout.isTTY === true,
  width: process.stdout.isTTY ? process.stdout.columns : undefined,
  errorIsTerminal: process.stderr.isTTY === true,
  out: (text) => process.stdout.write(text),
  err: (text) => process.stderr.write(text),
  readFile: (path) => readFile(path),
  writeFile: (path, text) => writeFile(path, text, 'utf8'),
  isFile: async (path) => {
    try {
      return (await stat(path)).isFile();
    } catch {
      return false;
    }
  },
  packageFolder: join(__dirname, '..'),
  today: () => new Date().toISOString().slice(0, 10),
  readInput: async () => {
    const chunks: Buffer[] = [];
    for await (const chunk of process.stdin) chunks.push(Buffer.from(chunk));
    return Buffer.concat(chunks);
  },
};

// A reader that has seen enough, such as `head`, closes the pipe: no reason to complain.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code !== 'EPIPE') throw error;
  process.exit();
});

run(process.argv.slice(2), io).then(
  (code) => {
    // Not `process.exit`: what is still to be written must reach a pipe.
    process.exitCode = code;
  },
  (error: unknown) => {
    process.stderr.write(
      `rail-ledger: ${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`,
    );
    process.exitCode = 2;
  },
);
