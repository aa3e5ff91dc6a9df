/**
 * Whether to colour: the option first, then the two customary variables, then what the terminal is.
 */
import type { ColorChoice } from './arguments';

export interface ColourHints {
  readonly env: Readonly<Record<string, string | undefined>>;
  readonly isTerminal: boolean;
}

export function useColour(choice: ColorChoice, { env, isTerminal }: ColourHints): boolean {
  if (choice !== 'auto') return choice === 'always';
  if (env.NO_COLOR !== undefined && env.NO_COLOR !== '') return false;
  if (env.FORCE_COLOR !== undefined && env.FORCE_COLOR !== '')
    return env.FORCE_COLOR !== '0' && env.FORCE_COLOR !== 'false';
  return isTerminal && env.TERM !== 'dumb';
}
