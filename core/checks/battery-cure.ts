/**
 * What would make a battery last as long as it must, with figures: more capacity, less current, less of the heavy mode.
 */
import type { BatteryLife, Run } from '../analysis/battery';
import { formatPercent, formatQuantity } from '../quantity/write';

/** One sentence, or none when nothing of the kind would do. `wanted` in seconds. */
export function batteryCure(life: BatteryLife, run: Run, wanted: number): readonly string[] {
  // Not even a full one carries the load: neither charge nor time is what it lacks.
  if (!(run.seconds > 0)) return [];
  const { usable, left, capacity, current, selfCurrent } = run;
  // Part of the nameplate that this board takes out, and what is lost in the time that is wanted.
  const takes = usable * (1 - left);
  const lost = (selfCurrent * wanted) / capacity;
  if (!(takes > lost)) {
    const share = formatPercent(lost, 2);
    return [
      `In that time it loses ${share} of its nameplate by itself: no capacity does, only another kind of battery.`,
    ];
  }
  const charge = roundedUp((current * wanted) / (takes - lost));
  const amps = roundedDown(((takes - lost) * capacity) / wanted);
  const cures = [
    `a capacity of ${formatQuantity(charge, 'C')} instead of ${formatQuantity(capacity, 'C')}`,
    `or an average of ${formatQuantity(amps, 'A')} instead of ${formatQuantity(current, 'A')}`,
  ];
  const share = shareFor(life, run, amps);
  const way =
    share === undefined
      ? ''
      : `, for example mode ${run.top.mode} for ${formatPercent(share, 2)} of the time instead of ${formatPercent(run.top.time, 2)}`;
  return [`It takes ${cures.join(', ')}${way}.`];
}

/** Share of the time that the mode which takes most may have, the rest given to the lightest mode. */
function shareFor({ lightest }: BatteryLife, { top, current }: Run, amps: number): number | undefined {
  if (top.mode === undefined || !(top.amps > lightest)) return undefined;
  const share = top.time - (current - amps) / (top.amps - lightest);
  return share > 0 ? roundedDown(share, 2) : undefined;
}

function roundedUp(value: number, digits = 3): number {
  const step = 10 ** (Math.floor(Math.log10(value)) + 1 - digits);
  return Math.ceil(value / step - 1e-9) * step;
}

function roundedDown(value: number, digits = 3): number {
  const step = 10 ** (Math.floor(Math.log10(value)) + 1 - digits);
  return Math.floor(value / step + 1e-9) * step;
}
