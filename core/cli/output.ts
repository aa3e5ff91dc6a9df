/**
 * What every command says in the same way: complaints, exit codes, and the width where no terminal tells one.
 */
import type { Io } from './io';

export type ExitCode = 0 | 1 | 2;

/** Columns where there is no terminal to ask, as in a log: enough for every table. */
export const usualWidth = 120;

export function complain(io: Io, sentence: string): 2 {
  io.err(`rail-ledger: ${sentence}\n`);
  return 2;
}
