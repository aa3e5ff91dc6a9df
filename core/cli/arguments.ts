/**
 * What was asked for on the command line. Wrong use is an answer with a sentence, not an exception.
 */

export interface CheckRequest {
  readonly command: 'check';
  /** As written; `-` is standard input. Empty: look for a board. */
  readonly files: readonly string[];
  readonly format: Format;
  readonly color: ColorChoice;
  /** Name to show for standard input. */
  readonly stdinName: string;
}

export type Request =
  | CheckRequest
  | { readonly command: 'help' }
  | { readonly command: 'version' }
  | { readonly command: 'wrong'; readonly because: string };

const formats = ['text', 'json'] as const;
const colorChoices = ['auto', 'always', 'never'] as const;
export type Format = (typeof formats)[number];
export type ColorChoice = (typeof colorChoices)[number];

const options = ['--format', '--color', '--stdin-filename', '--help', '--version'];

export function readArguments(args: readonly string[]): Request {
  const files: string[] = [];
  let format: Format = 'text';
  let color: ColorChoice = 'auto';
  let stdinName = 'standard-input.rails.yaml';
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
    if (!options.includes(name))
      return wrong(`There is no option ${name}; the options are ${options.join(', ')}.`);
    const value = equals < 0 ? args[++k] : arg.slice(equals + 1);
    if (value === undefined) return wrong(`${name} needs a value.`);
    if (name === '--stdin-filename') stdinName = value;
    else if (name === '--format' && isOneOf(formats, value)) format = value;
    else if (name === '--color' && isOneOf(colorChoices, value)) color = value;
    else
      return wrong(
        `${name} is ${(name === '--format' ? formats : colorChoices).join(' or ')}, not ${value}.`,
      );
  }

  if (command === undefined) return wrong('There is nothing to do: say rail-ledger check, or --help.');
  if (command !== 'check') return wrong(`There is no command ${command}; the command is check.`);
  return { command: 'check', files, format, color, stdinName };
}

function wrong(because: string): Request {
  return { command: 'wrong', because };
}

function isOneOf<T extends string>(list: readonly T[], value: string): value is T {
  return (list as readonly string[]).includes(value);
}
