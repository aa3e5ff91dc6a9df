/**
 * A supply as a store of charge: what its life is computed from, of the file where it says so, else of the catalogue.
 */
import type { BatteryData } from '../catalog/part';
import type { Finding } from '../checks/finding';
import type { Board, Supply } from '../model/board';
import { type Band, exactly, type Figure } from '../quantity/figure';
import { formatQuantity } from '../quantity/write';

/** Voltages are magnitudes; a battery that makes a negative rail hangs the other way round. */
export interface Store {
  /** Nameplate, C. */
  readonly capacity: Figure;
  /** Part of it that may be counted on. */
  readonly usable: Band;
  /** Share of the nameplate that is lost in a year of 8760 h. */
  readonly selfDischarge: Band;
  /** Absent for a plain voltage. */
  readonly data?: BatteryData;
  readonly negative: boolean;
  /** Full, without load, V. */
  readonly full: number;
  /** Loaded voltage at which it is empty, V; null for a voltage that the file gives without a band. */
  readonly end: number | null;
  readonly knots: readonly number[];
  open(left: number): number;
  resistance(left: number, which: 'typical' | 'max'): number;
}

/** Undefined for a supply that does not run down, or whose capacity nobody knows. */
export function storeOf(supply: Supply): Store | undefined {
  if (supply.battery) return supply.battery.data && batteryStore(supply, supply.battery.data);
  return supply.voltage && supply.capacity && plainStore(supply, supply.voltage, supply.capacity);
}

/** A clause: why a supply has no store. */
export function whyEndless({ standard, voltage, name }: Supply): string {
  if (standard) return 'a port does not run down';
  return voltage ? 'its capacity is not given' : `the voltage of ${name} is not known`;
}

function batteryStore(supply: Supply, data: BatteryData): Store {
  const cells = supply.cells?.typical ?? 1;
  const { openVoltage, agedResistance, voltage } = data;
  const cell = curve(openVoltage, ({ volts }) => volts.typical);
  const rise = curve(agedResistance, ({ ohms }) => ohms.typical);
  const { resistance } = supply;
  return {
    capacity: supply.capacity ?? data.capacity,
    usable: data.usable,
    selfDischarge: data.selfDischarge,
    data,
    negative: false,
    full: cells * cell(1),
    end: cells * voltage.min,
    knots: [...new Set([...openVoltage, ...agedResistance].map(({ left }) => left))].sort((a, b) => b - a),
    open: (left) => cells * cell(left),
    // A resistance of the file is that of a full battery, and rises by the catalogue's course.
    resistance: (left, which) =>
      resistance
        ? (resistance[which] * rise(left)) / rise(1)
        : cells * curve(agedResistance, ({ ohms }) => ohms[which])(left),
  };
}

/** From the upper edge of the band through typical to the lower one; a voltage without a band stays. */
function plainStore({ resistance }: Supply, voltage: Figure, capacity: Figure): Store {
  const negative = voltage.typical < 0;
  const sizes = [Math.abs(voltage.min), Math.abs(voltage.max)];
  // A band that reaches zero is no battery's: it has no end that could be computed.
  const empty = voltage.min * voltage.max > 0 ? Math.min(...sizes) : 0;
  const full = Math.max(...sizes);
  const course = [
    { left: 1, volts: full },
    { left: 0.5, volts: Math.abs(voltage.typical) },
    { left: 0, volts: empty },
  ];
  return {
    capacity,
    usable: exactly(1),
    selfDischarge: exactly(0),
    negative,
    full,
    end: full > empty || empty === 0 ? empty : null,
    knots: [1, 0.5, 0],
    open: curve(course, ({ volts }) => volts),
    resistance: (_, which) => resistance?.[which] ?? 0,
  };
}

/** Straight lines between points that run from full to empty. */
function curve<T extends { readonly left: number }>(
  points: readonly T[],
  value: (point: T) => number,
): (left: number) => number {
  return (left) => {
    const k = points.findIndex((point) => point.left <= left);
    const [above, below] = [points[Math.max(0, k - 1)], points[k < 0 ? points.length - 1 : k]];
    if (!above || !below) return Number.NaN;
    if (above.left === below.left) return value(below);
    const part = (left - below.left) / (above.left - below.left);
    return value(below) + part * (value(above) - value(below));
  };
}

/** A battery whose capacity the file leaves out counts with that of its kind, and the report says so. */
export function assumedCapacities(board: Board): Finding[] {
  return [...board.supplies.values()].flatMap((supply): Finding[] => {
    const capacity = supply.capacity ? undefined : supply.battery?.data?.capacity;
    if (!capacity) return [];
    const { origin } = capacity;
    const shown = formatQuantity(capacity.typical, 'C');
    return [
      {
        code: 'assumed',
        severity: 'information',
        at: supply.path,
        span: supply.nameSpan,
        message: `${supply.name}: its capacity is not given; ${shown} is taken from the catalogue (${origin.note ?? origin.kind}). Write capacity to settle it.`,
        actual: shown,
        source: origin.kind,
      },
    ];
  });
}
