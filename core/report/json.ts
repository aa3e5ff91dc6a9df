/**
 * The analysed board as the report that outside readers rely on: plain numbers in SI units, `null` where
 * something is not computed.
 */

import { isGap } from '../analysis/gap';
import { inrushPeak } from '../analysis/inrush-peak';
import type {
  BoardAnalysis,
  ChipResult,
  ClockResult,
  DriverResult,
  DriverUse,
  GroupResult,
  PinResult,
  RailResult,
  SupplyResult,
} from '../analysis/types';
import type { Finding, Waived } from '../checks/finding';
import { type LineIndex, lineIndex } from '../text/lines';
import { benchReport } from './json-bench';
import { band, finite } from './plain';
import type {
  ChipReport,
  ClockReport,
  DriverReport,
  FindingReport,
  GroupReport,
  PartReport,
  PinReport,
  Position,
  RailReport,
  Report,
  SupplyReport,
} from './report';

/** `tool` names program and version; `findings` are all of the board, in the order to report them. */
export function toReport(
  analysis: BoardAnalysis,
  findings: readonly Finding[],
  waived: readonly Waived[],
  tool: string,
): Report {
  const lines = lineIndex(analysis.text);
  return {
    format: 1,
    tool,
    file: analysis.file,
    board: analysis.reading.board.title ?? null,
    rails: mapped(analysis.rails, railReport),
    pins: mapped(analysis.pins, (pin) => pinReport(pin, analysis)),
    groups: mapped(analysis.groups, groupReport),
    chips: mapped(analysis.chips, chipReport),
    clocks: mapped(analysis.clocks, clockReport),
    drivers: mapped(analysis.drivers, driverReport),
    supplies: mapped(analysis.supplies, supplyReport),
    parts: partReports(analysis),
    bench: analysis.bench().map(benchReport),
    balance: finite(analysis.balance),
    findings: findings.map((finding) => findingReport(finding, lines)),
    waived: waived.map(({ finding, because, until }) => ({
      ...findingReport(finding, lines),
      because,
      until: until ?? null,
    })),
  };
}

/** The worst of the pumps behind the driver, figure by figure. */
function driverReport({ uses }: DriverResult): DriverReport {
  const worst = (figure: (use: DriverUse) => number | null | undefined) => {
    const values = uses.map(figure).filter((value) => value !== undefined && value !== null);
    return values.length > 0 ? finite(Math.max(...values)) : null;
  };
  return {
    baseCurrent: worst(({ stage }) => stage?.baseCurrent),
    forcedGain: worst(({ stage }) => stage?.forcedGain),
    dissipation: worst(({ stage, pair }) => (stage ?? pair)?.dissipation),
    inputCurrent: worst(({ clockCurrent }) => clockCurrent),
  };
}

function railReport({ pump, transients, filter, ...rail }: RailResult): RailReport {
  const point = pump?.heaviest ?? filter;
  const course = transients?.();
  return {
    voltage: band(rail.voltage),
    ripple: band(rail.ripple),
    current: finite(rail.current),
    inputCurrent: finite(rail.inputCurrent),
    power: finite(rail.power),
    efficiency: finite(rail.efficiency),
    openCircuit: finite(point?.openCircuit),
    outputResistance: finite(point?.outputResistance),
    headroom: finite(rail.headroom),
    drops: point ? point.drops.map((drop) => ({ in: drop.in, volts: drop.volts })) : null,
    startTime: finite(course?.startTime),
    dischargeTime: finite(course?.dischargeTime),
    storedEnergy: finite(rail.storedEnergy),
    modes: mapped(rail.modes, ({ voltage, current }) => ({
      voltage: finite(voltage),
      current: finite(current),
    })),
  };
}

function pinReport(pin: PinResult, analysis: BoardAnalysis): PinReport {
  return {
    sourceAverage: finite(pin.sourceAverage),
    sinkAverage: finite(pin.sinkAverage),
    rms: finite(pin.rms),
    peakSource: finite(pin.peakSource),
    peakSink: finite(pin.peakSink),
    inrushPeak: finite(inrushPeak(pin, analysis)),
    limit: finite(pin.limit?.typical),
    use: finite(pin.use),
  };
}

function groupReport({ source, sink, use }: GroupResult): GroupReport {
  return { source: finite(source), sink: finite(sink), use: finite(use) };
}

function chipReport(chip: ChipResult): ChipReport {
  return {
    voltage: band(chip.voltage),
    current: band(chip.current),
    sourceTotal: finite(chip.sourceTotal),
    sinkTotal: finite(chip.sinkTotal),
    use: finite(chip.use),
  };
}

function clockReport({ frequency, duty, high, low }: ClockResult): ClockReport {
  return { frequency: band(frequency), duty: band(duty), high: finite(high), low: finite(low) };
}

function supplyReport({ current, power, use, life }: SupplyResult): SupplyReport {
  const found = life?.();
  const lasts = found && !isGap(found) ? found.typical.seconds : null;
  return { current: band(current), power: finite(power), use: finite(use), life: finite(lasts) };
}

/** Each part at the pump's heaviest load. */
function partReports(analysis: BoardAnalysis): Record<string, PartReport> {
  const parts: [string, PartReport][] = [];
  for (const { pump } of analysis.rails.values()) {
    if (pump === undefined) continue;
    for (const { key, voltage, rmsCurrent, effective } of pump.heaviest.capacitors)
      parts.push([
        key,
        { voltage: finite(voltage), rmsCurrent: finite(rmsCurrent), effective: finite(effective) },
      ]);
    for (const { key, reverse, average, peak } of pump.heaviest.diodes)
      parts.push([key, { reverse: finite(reverse), average: finite(average), peak: finite(peak) }]);
  }
  return Object.fromEntries(parts);
}

function findingReport(finding: Finding, lines: LineIndex): FindingReport {
  const position = (offset: number): Position => ({ ...lines.position(offset), offset });
  return {
    code: finding.code,
    severity: finding.severity,
    at: finding.at,
    range: { start: position(finding.span.start), end: position(finding.span.end) },
    message: finding.message,
    expected: finding.expected ?? null,
    actual: finding.actual ?? null,
    source: finding.source ?? null,
    fixes: (finding.fixes ?? []).map(({ title, edits }) => ({
      title,
      edits: edits.map(({ span, text }) => ({ start: span.start, end: span.end, text })),
    })),
  };
}

/** `fromEntries` keeps even a name such as `__proto__` as an own property. */
function mapped<T, R>(entries: ReadonlyMap<string, T>, convert: (value: T) => R): Record<string, R> {
  return Object.fromEntries([...entries].map(([name, value]) => [name, convert(value)]));
}
