/**
 * `rail-ledger explain [CODE]`: the page of a finding, or the list of all of them. The pages lie beside the program, in
 * the package's `media/findings`.
 */
import { join } from 'node:path';
import { findingTitles } from '../index';
import type { ExplainRequest } from './arguments';
import { reason } from './files';
import type { Io } from './io';
import { complain, type ExitCode } from './output';

export async function explain({ code }: ExplainRequest, io: Io): Promise<ExitCode> {
  if (code === undefined) {
    const widest = Math.max(...findingTitles.map((each) => each.code.length));
    io.out(`${findingTitles.map((each) => `${each.code.padEnd(widest)}  ${each.title}`).join('\n')}\n`);
    return 0;
  }
  if (!findingTitles.some((each) => each.code === code))
    return complain(io, `There is no finding ${code}; rail-ledger explain lists them.`);
  const file = join(io.packageFolder, 'media', 'findings', `${code}.md`);
  try {
    io.out(new TextDecoder().decode(await io.readFile(file)));
    return 0;
  } catch (error) {
    return complain(io, `The page of ${code} cannot be read from ${file}: ${reason(error)}.`);
  }
}
