/**
 * What an amplifier's signal asks of the rail that feeds it: at every moment at least the peak of the signal and the
 * headroom between signal and rail, in magnitude. The moment that counts is the weakest one of the ripple at the
 * heaviest load. Source: output swing of any amplifier between its rails, `V+ >= Vp + Vsat+`, `V- <= -Vp - Vsat-`.
 */
import { memory } from '../catalog/figures';
import type { Finding } from '../checks/finding';
import type { Needs, Rail } from '../model/board';
import { type Figure, figure } from '../quantity/figure';
import { formatQuantity } from '../quantity/write';
import type { CornerEnd, PumpPoint, PumpResult, RailResult } from './types';

export interface SwingNeed {
  readonly swing: Figure;
  /** From the file, or that of the usual amplifier: `headroomGiven` tells which. */
  readonly headroom: Figure;
  readonly headroomGiven: boolean;
  /** Edge that no moment may pass, V, signed as the rail is. */
  readonly limit: number;
}

/** A moment at which the rail holds less than its signal needs. */
export interface SwingMiss {
  readonly result: RailResult;
  readonly need: SwingNeed;
  /** Weakest moment, V, signed. */
  readonly voltage: number;
  /** How far short, V, positive. */
  readonly by: number;
  /** How far the moment lies from the average, V, positive: what a larger reservoir could win at most. */
  readonly dip: number;
  readonly mode?: string;
  /** Present when the typical board meets the need. */
  readonly corner?: CornerEnd;
}

const amplifier = 'bipolar single-supply amplifier, general purpose';
/** To the upper rail at 2 to 10 mA, and to the lower one when it sinks more than 50 uA, V. */
const usualHeadroom = {
  upper: figure(1.5, 'V', memory(`${amplifier}: output to its upper rail at 2 to 10 mA`)),
  lower: figure(0.7, 'V', memory(`${amplifier}: output to its lower rail, sinking more than 50 uA`)),
};

export function swingNeed(needs: Needs | undefined, negative: boolean): SwingNeed | undefined {
  const swing = needs?.swing;
  if (!swing) return undefined;
  const headroom = needs.headroom ?? (negative ? usualHeadroom.lower : usualHeadroom.upper);
  const total = swing.max + headroom.max;
  return { swing, headroom, headroomGiven: needs.headroom !== undefined, limit: negative ? -total : total };
}

/** The need of a rail whose voltage is known. */
export function swingNeedOf(result: Pick<RailResult, 'rail' | 'voltage' | 'pump'>): SwingNeed | undefined {
  return swingNeed(result.rail.needs, isBelowGround(result));
}

/** A moment and its distance from the average, V. */
export interface Moment {
  readonly voltage: number;
  readonly dip: number;
}

/** Weakest moments of a rail, V, signed: one for each mode at typical values, and one at the corners. */
export interface WeakestMoments {
  readonly typical: readonly (Moment & { readonly mode?: string })[];
  readonly corner: Moment & { readonly end: CornerEnd };
}

type Moving = Pick<RailResult, 'rail' | 'voltage' | 'ripple' | 'pump'>;

/** Undefined where the rail has no voltage. */
export function weakestMoments(result: Moving): WeakestMoments | undefined {
  const { voltage, ripple, pump } = result;
  if (!voltage) return undefined;
  if (pump) return pumpMoments(pump);
  // The average stands in the middle of a filtered ripple, near enough.
  const down = isBelowGround(result);
  const at = (volts: number, peaks = 0): Moment => ({
    voltage: down ? volts + peaks / 2 : volts - peaks / 2,
    dip: peaks / 2,
  });
  const end = { value: down ? voltage.max : voltage.min, settings: [] };
  return {
    typical: [at(voltage.typical, ripple?.typical)],
    corner: { ...at(end.value, ripple?.max), end },
  };
}

export function pumpMoments(pump: PumpResult): WeakestMoments {
  const down = pump.heaviest.ideal < 0;
  const dipOf = (point: PumpPoint) => Math.abs((down ? point.highest : point.lowest) - point.voltage);
  const at = (volts: number, dip: number): Moment => ({ voltage: down ? volts + dip : volts - dip, dip });
  const end = down ? pump.voltage.highest : pump.voltage.lowest;
  return {
    typical: pump.points.map((point) => ({
      ...at(point.voltage, dipOf(point)),
      ...(point.mode === undefined ? {} : { mode: point.mode }),
    })),
    corner: { ...at(end.value, cornerDip(end.point ?? pump.heaviest, pump, dipOf)), end },
  };
}

/**
 * The corner of the average is solved and has a dip of its own; but a reservoir hardly moves the average, so that
 * corner may have it at its large end. The dip is taken to grow as the ripple does at the ripple's own corner.
 */
function cornerDip(point: PumpPoint, pump: PumpResult, dipOf: (point: PumpPoint) => number): number {
  const grows = point.ripple > 0 ? Math.max(1, pump.ripple.highest.value / point.ripple) : 1;
  return dipOf(point) * grows;
}

/** Volts that a moment has left to the edge, negative when it is short. */
export function spareAt({ limit }: SwingNeed, voltage: number): number {
  return limit < 0 ? limit - voltage : voltage - limit;
}

/** True when a moment holds less than the signal needs, rounding errors apart. */
export function isClipped(need: SwingNeed, voltage: number): boolean {
  return spareAt(need, voltage) < -1e-9 * Math.max(1, Math.abs(need.limit));
}

/** The rail's miss of what its signal needs, if it has one: typical first, else at the corner. */
export function swingMissOf(result: RailResult): SwingMiss | undefined {
  const need = swingNeedOf(result);
  const moments = need && weakestMoments(result);
  if (!need || !moments) return undefined;
  const worst = moments.typical.reduce((a, b) =>
    spareAt(need, b.voltage) < spareAt(need, a.voltage) ? b : a,
  );
  const by = (voltage: number) => -spareAt(need, voltage);
  if (isClipped(need, worst.voltage)) return { result, need, by: by(worst.voltage), ...worst };
  const { corner } = moments;
  if (!isClipped(need, corner.voltage)) return undefined;
  return {
    result,
    need,
    by: by(corner.voltage),
    voltage: corner.voltage,
    dip: corner.dip,
    corner: corner.end,
  };
}

function isBelowGround({ voltage, pump }: Pick<RailResult, 'voltage' | 'pump'>): boolean {
  return pump ? pump.heaviest.ideal < 0 : (voltage?.typical ?? 0) < 0;
}

/** `4 V of swing and 1.5 V of headroom`. */
export function swingWords({ swing, headroom }: SwingNeed): string {
  return `${formatQuantity(swing.max, 'V')} of swing and ${formatQuantity(headroom.max, 'V')} of headroom`;
}

/** A headroom that the file leaves out is that of the usual amplifier, and the report says so; one alone says nothing. */
export function assumedHeadrooms(rails: ReadonlyMap<string, RailResult>): Finding[] {
  return [...rails.values()].flatMap((result): Finding[] => {
    const { rail } = result;
    if (rail.needs?.headroom && !rail.needs.swing) return [withoutSwing(rail)];
    const need = result.voltage ? swingNeedOf(result) : undefined;
    if (!need || need.headroomGiven) return [];
    const shown = formatQuantity(need.headroom.typical, 'V');
    const { origin } = need.headroom;
    return [
      {
        code: 'assumed',
        severity: 'information',
        at: `${rail.path}.needs.headroom`,
        span: rail.needs?.keys.get('swing') ?? rail.nameSpan,
        message: `${rail.name}: what its amplifier needs between signal and rail is not given; ${shown} is taken (${origin.note}). Write headroom to settle it: rail-to-rail outputs need less.`,
        actual: shown,
        source: origin.kind,
      },
    ];
  });
}

function withoutSwing(rail: Rail): Finding {
  return {
    code: 'missing-key',
    severity: 'warning',
    at: `${rail.path}.needs.swing`,
    span: rail.needs?.keys.get('headroom') ?? rail.nameSpan,
    message: `${rail.name}: headroom says nothing without the peak that the signal must reach. For example \`swing: 4 V\`.`,
  };
}
