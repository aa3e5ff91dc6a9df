/**
 * What was asked for on the command line. Wrong use is an answer with a sentence, not an exception.
 */
import { mostSamples, usualSamples } from '../index';

export interface CheckRequest {
  readonly command: 'check';
  /** As written; `-` is standard input. Empty: look for a board. */
  readonly files: readonly string[];
  readonly format: Format;
  readonly color: ColorChoice;
  /** Name to show for standard input. */
  readonly stdinName: string;
}

export interface YieldRequest {
  readonly command: 'yield';
  /** As written; `-` is standard input. Absent: look for a board. */
  readonly file: string | undefined;
  readonly format: Format;
  readonly color: ColorChoice;
  readonly stdinName: string;
  readonly samples: number;
  readonly seed: number;
  readonly distribution: Distribution;
}

export interface ExplainRequest {
  readonly command: 'explain';
  /** Absent: list all. */
  readonly code: string | undefined;
}

export interface SizeRequest {
  readonly command: 'size';
  readonly rail: string;
  /** As written; `-` is standard input. Absent: look for a board. */
  readonly file: string | undefined;
  readonly format: Format;
  readonly color: ColorChoice;
  readonly stdinName: string;
  /** Puts the first way into the file. */
  readonly write: boolean;
}

export type Request =
  | SizeRequest
  | CheckRequest
  | ExplainRequest
  | YieldRequest
  | { readonly command: 'help' }
  | { readonly command: 'version' }
  | { readonly command: 'wrong'; readonly because: string };

export type Format = 'text' | 'json';
export type ColorChoice = 'auto' | 'always' | 'never';
export type Distribution = 'uniform' | 'triangular';

const commands = ['check', 'size', 'yield', 'explain'] as const;
const onBoards: readonly Command[] = ['check', 'size', 'yield'];
type Command = (typeof commands)[number];

interface Option {
  readonly of: readonly Command[];
  /** Why a value will not do; anything will where this is left out. */
  /** True for an option without a value. */
  readonly flag?: true;
  readonly fault?: (value: string) => string | undefined;
}

const options: Readonly<Record<string, Option>> = {
  '--format': { of: onBoards, fault: oneOf('text', 'json') },
  '--color': { of: onBoards, fault: oneOf('auto', 'always', 'never') },
  '--stdin-filename': { of: onBoards },
  '--write': { of: ['size'], flag: true },
  '--samples': { of: ['yield'], fault: wholeNumber(1, mostSamples) },
  '--seed': { of: ['yield'], fault: wholeNumber(0, Number.MAX_SAFE_INTEGER) },
  '--distribution': { of: ['yield'], fault: oneOf('uniform', 'triangular') },
};

export function readArguments(args: readonly string[]): Request {
  const files: string[] = [];
  const given = new Map<string, string>();
  let command: string | undefined;
  let onlyNames = false;

  for (let k = 0; k < args.length; k++) {
    const arg = args[k] ?? '';
    if (onlyNames || arg === '-' || !arg.startsWith('-')) {
      if (command === undefined) command = arg;
      else files.push(arg);
      continue;
    }
    if (arg === '--') {
      onlyNames = true;
      continue;
    }
    if (arg === '--help' || arg === '-h') return { command: 'help' };
    if (arg === '--version' || arg === '-V') return { command: 'version' };
    const equals = arg.indexOf('=');
    const name = equals < 0 ? arg : arg.slice(0, equals);
    const option = Object.hasOwn(options, name) ? options[name] : undefined;
    if (!option) {
      const known = [...Object.keys(options), '--help', '--version'].join(', ');
      return wrong(`There is no option ${name}; the options are ${known}.`);
    }
    if (option.flag) {
      if (equals >= 0) return wrong(`${name} takes no value.`);
      given.set(name, 'yes');
      continue;
    }
    const value = equals < 0 ? args[++k] : arg.slice(equals + 1);
    if (value === undefined) return wrong(`${name} needs a value.`);
    const fault = option.fault?.(value);
    if (fault !== undefined) return wrong(`${name} is ${fault}, not ${value}.`);
    given.set(name, value);
  }

  if (command === undefined) return wrong('There is nothing to do: say rail-ledger check, or --help.');
  if (!isCommand(command))
    return wrong(
      `There is no command ${command}; the commands are ${commands.slice(0, -1).join(', ')} and ${commands.at(-1)}.`,
    );
  for (const name of given.keys())
    if (!options[name]?.of.includes(command)) return wrong(`${command} has no option ${name}.`);
  if (command === 'check') return { command, files, ...common(given) };
  if (command === 'size') return sizeRequest(files, given);
  return command === 'yield' ? yieldRequest(files, given) : explainRequest(files);
}

type Given = ReadonlyMap<string, string>;

// The casts hold what the options' own checks have let through.
function common(given: Given): Pick<CheckRequest, 'format' | 'color' | 'stdinName'> {
  return {
    format: (given.get('--format') ?? 'text') as Format,
    color: (given.get('--color') ?? 'auto') as ColorChoice,
    stdinName: given.get('--stdin-filename') ?? 'standard-input.rails.yaml',
  };
}

function yieldRequest(files: readonly string[], given: Given): Request {
  if (files.length > 1) return wrong(`yield takes one file, not ${files.length}.`);
  return {
    command: 'yield',
    file: files[0],
    ...common(given),
    samples: Number(given.get('--samples') ?? usualSamples),
    seed: Number(given.get('--seed') ?? 1),
    distribution: (given.get('--distribution') ?? 'uniform') as Distribution,
  };
}

function sizeRequest([rail, file, ...more]: readonly string[], given: Given): Request {
  if (rail === undefined) return wrong('size needs the name of a rail.');
  if (more.length > 0) return wrong(`size takes a rail and one file, not ${more.length + 2} names.`);
  return { command: 'size', rail, file, ...common(given), write: given.has('--write') };
}

function explainRequest(codes: readonly string[]): Request {
  if (codes.length > 1) return wrong(`explain takes one code, not ${codes.length}.`);
  return { command: 'explain', code: codes[0] };
}

function wrong(because: string): Request {
  return { command: 'wrong', because };
}

function isCommand(word: string): word is Command {
  return (commands as readonly string[]).includes(word);
}

function oneOf(...list: readonly string[]) {
  return (value: string) => (list.includes(value) ? undefined : list.join(' or '));
}

function wholeNumber(least: number, most: number) {
  return (value: string) => {
    const fits = /^\d+$/.test(value) && Number(value) >= least && Number(value) <= most;
    return fits ? undefined : `a whole number from ${least} to ${most}`;
  };
}
