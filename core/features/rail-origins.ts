/**
 * Where the figures of a rail come from, line by line: the solution and its quality, the same by hand, the corners,
 * and the parts with the origin of their data.
 */
import type { BoardAnalysis, CornerEnd, PumpResult, RailResult } from '../analysis/types';
import { cornerWords, inMode, originWords, volts } from '../analysis/words';
import { diodeCount } from '../compute/pump-topology';
import type { Capacitor, Pump } from '../model/board';
import { formatBand, formatPercent, formatQuantity } from '../quantity/write';

export function railOrigins(analysis: BoardAnalysis, result: RailResult): readonly string[] {
  const { origin } = result.rail;
  switch (origin?.kind) {
    case 'pump':
      return result.pump ? pumpOrigins(analysis, origin.pump, result.pump) : [];
    case 'supply':
      return supplyOrigins(analysis, origin.supply.name);
    case 'regulator': {
      const { output } = origin.regulator;
      return output ? [`Output of the regulator as the file gives it: ${formatBand(output, 'V')}.`] : [];
    }
    default:
      return [];
  }
}

function supplyOrigins(analysis: BoardAnalysis, name: string): readonly string[] {
  const supply = analysis.supplies.get(name)?.supply;
  const entry = supply?.standard?.data ?? supply?.battery?.data;
  if (entry) return [`${entry.title}: ${originWords(entry.voltage.origin)}.`];
  return supply?.voltage
    ? [`Voltage of ${name} as the file gives it: ${formatBand(supply.voltage, 'V')}.`]
    : [];
}

function pumpOrigins(analysis: BoardAnalysis, pump: Pump, result: PumpResult): readonly string[] {
  const { heaviest, voltage } = result;
  return [
    ...byHand(pump, result),
    ...cornerLine('Lowest', voltage.lowest),
    ...cornerLine('Highest', voltage.highest),
    ...influenceLine(result),
    ...partLines(analysis, pump),
    `Steady state of the circuit${inMode(heaviest.mode)}: ${heaviest.effort.iterations} iterations, ${heaviest.effort.steps} steps for a period; power in and out agree within ${formatPercent(heaviest.balance, 1)}.`,
  ];
}

function byHand(pump: Pump, { estimate, heaviest }: PumpResult): readonly string[] {
  if (!estimate || pump.topology === undefined) return [];
  const diodes = diodeCount(pump.topology, Math.round(pump.stages?.typical ?? 1));
  const minus = estimate.ideal < 0 ? '+' : '\u2212';
  return [
    `By hand: ${formatQuantity(estimate.ideal, 'V')} ideal ${minus} ${diodes} diodes of ${volts(estimate.diodeDrop)} ${minus} ${formatQuantity(heaviest.loadCurrent, 'A')} through ${formatQuantity(estimate.resistance, 'ohm')} = ${formatQuantity(estimate.voltage, 'V')}.`,
  ];
}

function cornerLine(which: string, end: CornerEnd): readonly string[] {
  return end.settings.length === 0
    ? []
    : [`${which} ${formatQuantity(end.value, 'V')}: ${cornerWords(end, 4)}.`];
}

function influenceLine({ influences }: PumpResult): readonly string[] {
  const first = influences.slice(0, 3).filter(({ volts: change }) => Math.abs(change) > 0);
  if (first.length === 0) return [];
  return [
    `Moves it most: ${first.map(({ label, volts: change }) => `${label} (${volts(change)})`).join(', ')}.`,
  ];
}

function partLines(analysis: BoardAnalysis, pump: Pump): readonly string[] {
  const diode = pump.diodes[0];
  const lines: string[] = [];
  if (diode?.data) lines.push(`${diode.ref?.name ?? 'Diode'}: ${diode.data.title}; ${diode.data.source}.`);
  const capacitors = [pump.flying[0], pump.reservoir].filter((part) => part !== undefined);
  const words = capacitors.map((part, k) => capacitorWords(k === 0 ? 'flying' : 'reservoir', part));
  if (words.length > 0) lines.push(`Capacitors: ${words.join('; ')}.`);
  for (const pin of analysis.pins.values()) {
    if (!pump.drive.some(({ name }) => clockPin(analysis, name) === pin.key)) continue;
    const { highResistance, lowResistance } = pin;
    if (highResistance && lowResistance)
      lines.push(
        `${pin.key}: ${formatBand(highResistance, 'ohm', 2)} high, ${formatBand(lowResistance, 'ohm', 2)} low (${highResistance.origin.kind}).`,
      );
  }
  return lines;
}

function clockPin(analysis: BoardAnalysis, name: string): string | undefined {
  const pin = analysis.reading.board.clocks.get(name)?.pin;
  return pin && `${pin.chip}.${pin.pin}`;
}

function capacitorWords(what: string, { value, kind, esr, toleranceGiven }: Capacitor): string {
  const size = value ? formatQuantity(value.typical, 'F') : '?';
  const tolerance = kind.data?.tolerance;
  const spread =
    tolerance && !toleranceGiven
      ? ` ${formatPercent(tolerance.min, 2)} to +${formatPercent(tolerance.max, 2)}`
      : '';
  const name = kind.ref?.name ?? kind.data?.key ?? '';
  const assumed = kind.assumed ? ' (assumed)' : '';
  const loss = esr ? `, ESR ${formatQuantity(esr.typical, 'ohm', 2)}` : '';
  return `${what} ${size} ${name}${assumed}${spread}${loss}`;
}
