/**
 * The ways to make a rail for a terminal: one block for each, the cheapest first.
 */
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Palette } from './paint';

/** As the sizing hands it out; only what is printed. */
export interface SizeText {
  readonly rail: string;
  readonly choices: readonly {
    readonly best: readonly string[];
    readonly title: string;
    readonly voltage: { readonly min: number; readonly typical: number; readonly max: number };
    readonly ripple: number;
    readonly efficiency: number | null;
    readonly pins: readonly {
      readonly pin: string;
      readonly rms: number | null;
      readonly use: number | null;
    }[];
    readonly parts: readonly { readonly count: number; readonly part: string }[];
    readonly partCount: number;
    readonly limit: string;
  }[];
  readonly because: readonly string[];
  readonly solves: number;
  readonly space: number;
}

export function sizeText({ rail, choices, because, solves, space }: SizeText, palette: Palette): string {
  const effort = palette.faint(
    `${solves} designs solved of ${space.toLocaleString('en-GB')} that there are${space > 0 ? ` (${formatPercent(solves / space, 2)})` : ''}.`,
  );
  if (choices.length === 0)
    return `${palette.bad(`${rail}: nothing found.`)}\n${because.join('\n')}\n${effort}\n`;
  const blocks = choices.map((choice, k) => {
    const { min, typical, max } = choice.voltage;
    const volts = (value: number) => formatQuantity(value, 'V', 3);
    const pins = choice.pins
      .map(({ pin, rms, use }) =>
        rms === null
          ? pin
          : `${pin} ${formatQuantity(rms, 'A', 2)} rms${use === null ? '' : ` (${formatPercent(use, 2)})`}`,
      )
      .join(', ');
    return [
      `${palette.strong(`${k + 1}. ${choice.title}`)}  ${palette.good(choice.best.join(', '))}`,
      `   voltage     ${volts(min)} to ${volts(max)}, typically ${volts(typical)}`,
      `   ripple      up to ${formatQuantity(choice.ripple, 'V', 2)}`,
      ...(choice.efficiency === null ? [] : [`   efficiency  ${formatPercent(choice.efficiency, 2)}`]),
      ...(pins === '' ? [] : [`   pins        ${pins}`]),
      `   ${choice.partCount} parts     ${choice.parts.map(({ count, part }) => `${count} x ${part}`).join(', ')}`,
      `   limit       ${choice.limit}`,
    ].join('\n');
  });
  return `${palette.heading(`Ways to make ${rail}`)}\n${blocks.join('\n\n')}\n\n${effort}\n`;
}
