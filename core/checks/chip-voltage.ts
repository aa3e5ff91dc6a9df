/**
 * Chips, gates and timers whose rail leaves the range that they work in.
 */
import type { BoardAnalysis } from '../analysis/types';
import type { Entry } from '../model/board';
import type { Band, Figure } from '../quantity/figure';
import { formatBand, formatQuantity } from '../quantity/write';
import type { Span } from '../text/span';
import type { Check } from './check';
import type { Finding } from './finding';

export const chipVoltage: Check = {
  code: 'chip-voltage',
  title: 'Chip outside its supply range',
  severity: 'error',
  why: 'Below its range a chip may run wild without a reset, above it may be destroyed.',
  run: (analysis) => [...chips(analysis), ...drivers(analysis), ...clocks(analysis)],
};

function chips(analysis: BoardAnalysis): readonly Finding[] {
  return [...analysis.chips.values()].flatMap(({ chip, data, voltage }) =>
    chip.rail ? judge(chip, chip.name, chip.rail, voltage, data?.supply) : [],
  );
}

/** Gates that drive a pump run from the driver's rail, or from that of their clock. */
function drivers(analysis: BoardAnalysis): readonly Finding[] {
  return [...analysis.drivers.values()].flatMap(({ driver, uses }) => {
    const { stage } = driver;
    if (stage?.kind !== 'gates') return [];
    const name = driver.rail?.name ?? uses[0]?.driverRail;
    if (name === undefined) return [];
    const rail = { name, span: driver.rail?.span ?? driver.nameSpan };
    const what = `The gates of ${driver.name}`;
    return judge(driver, what, rail, voltageOf(analysis, name), stage.part?.data?.supply, true);
  });
}

function clocks(analysis: BoardAnalysis): readonly Finding[] {
  return [...analysis.reading.board.clocks.values()].flatMap((clock) => {
    const made = clock.astable ?? clock.schmitt;
    if (!made || !clock.rail) return [];
    const what = `The ${clock.astable ? 'timer' : 'gate'} of ${clock.name}`;
    const voltage = voltageOf(analysis, clock.rail.name);
    return judge(clock, what, clock.rail, voltage, made.part?.data?.supply, false);
  });
}

function voltageOf({ rails }: BoardAnalysis, name: string): Band | null {
  return rails.get(name)?.voltage ?? null;
}

function judge(
  { path }: Entry,
  what: string,
  rail: { readonly name: string; readonly span: Span },
  voltage: Band | null,
  range: Figure | undefined,
  plural = false,
): readonly Finding[] {
  if (!range || !voltage) return [];
  const low = voltage.min < range.min;
  const high = voltage.max > range.max;
  if (!low && !high) return [];
  const always = voltage.typical < range.min || voltage.typical > range.max;
  const shown = formatQuantity(always ? voltage.typical : low ? voltage.min : voltage.max, 'V');
  const span = `${formatQuantity(range.min, 'V')} to ${formatQuantity(range.max, 'V')}`;
  const [gets, works, it] = plural ? ['get', 'work', 'them'] : ['gets', 'works', 'it'];
  return [
    {
      code: 'chip-voltage',
      severity: always ? 'error' : 'warning',
      at: `${path}.rail`,
      span: rail.span,
      message: `${what} ${gets} ${shown} from ${rail.name}${always ? '' : ' at a corner'} and ${works} from ${span}. Put ${it} on another rail or narrow this one (${formatBand(voltage, 'V')}).`,
      expected: span,
      actual: shown,
      source: range.origin.note ?? range.origin.kind,
    },
  ];
}
