/**
 * Drives of a pump as variables.
 */
import type { Course } from '../engine';
import { oppositePhase } from '../pump/phases';
import type { DriverValues, DriveValues } from '../pump/values';
import type { Band } from '../quantity/figure';
import type { DriverSource, DriveSource } from './drive-source';
import type { Book, Point } from './pump-book';
import { transistorPart } from './pump-parts';

/** Values of drive `k` at a point. `railIndex` finds the pump's rail by name. */
export function addDriveVariables(
  book: Book,
  source: DriveSource,
  k: number,
  railIndex: (name: string) => number,
  ambient: number,
  series: number | undefined,
): (p: Point) => DriveValues {
  const { label, path } = source;
  const some = (what: string, unit: 'V' | 'ohm', band: Band) =>
    band.max > 0 ? book.add(`${label} ${what}`, path, unit, band) : undefined;
  const highDrop = some('high drop', 'V', source.highDrop);
  const lowVolts = some('low voltage', 'V', source.lowVolts);
  const highOhms = some('high resistance', 'ohm', source.highOhms);
  const lowOhms = some('low resistance', 'ohm', source.lowOhms);
  book.ties((_p, at, tie) => {
    const place = at.drives[k]!;
    const phases = source.opposite ? at.phases.map(oppositePhase) : at.phases;
    const share = (level: string, edge: string): Course[] =>
      phases.map((phase) => (phase === level ? 1 : phase === edge ? [0, 1] : 0));
    tie(highOhms, { kind: 'ohms', index: place.high });
    tie(lowOhms, { kind: 'ohms', index: place.low });
    tie(highDrop, { kind: 'drop', index: place.high, share: share('high', 'rise') }, 1);
    tie(lowVolts, { kind: 'drop', index: place.low, share: share('low', 'fall') }, 1);
    if (place.series !== undefined) tie(series, { kind: 'ohms', index: place.series });
  });
  const driver = source.driver && addDriver(book, source.driver, k, railIndex, ambient);
  const clockRail = railIndex(source.railName);
  return (p) => ({
    clock: {
      rail: clockRail,
      highDrop: highDrop === undefined ? 0 : p[highDrop]!,
      highOhms: highOhms === undefined ? 0 : p[highOhms]!,
      lowVolts: lowVolts === undefined ? 0 : p[lowVolts]!,
      lowOhms: lowOhms === undefined ? 0 : p[lowOhms]!,
    },
    opposite: source.opposite,
    ...(driver ? { driver: driver(p) } : {}),
  });
}

function addDriver(
  book: Book,
  source: DriverSource,
  k: number,
  railIndex: (name: string) => number,
  ambient: number,
): (p: Point) => DriverValues {
  const npn = transistorPart(book, source.npn.label, source.npn.path, source.npn.data, ambient);
  const pnp = transistorPart(book, source.pnp.label, source.pnp.path, source.pnp.data, ambient);
  const resistor = (what: string, band: Band | undefined) =>
    band && band.min > 0
      ? book.add(`${source.name} ${what} resistor`, `${source.path}.${source.kind}.base`, 'ohm', band)
      : undefined;
  const separate = source.base && !('shared' in source.base) ? source.base : undefined;
  const shared = resistor(
    'shared base',
    source.base && 'shared' in source.base ? source.base.shared : undefined,
  );
  const npnBase = resistor('npn base', separate?.npn);
  const pnpBase = resistor('pnp base', separate?.pnp);
  book.ties((p, at, tie) => {
    const place = at.drives[k]!.driver;
    if (!place) return;
    npn.tie(p, place.npn, tie);
    pnp.tie(p, place.pnp, tie);
    if (place.shared !== undefined) tie(shared, { kind: 'ohms', index: place.shared });
    // The resistor in the network also holds the transistor's own base resistance.
    const whole = (variable: number | undefined, own: number) =>
      variable === undefined ? undefined : 1 / (p[variable]! + own);
    tie(npnBase, { kind: 'ohms', index: place.npn.base }, whole(npnBase, npn.values(p).baseOhms));
    tie(pnpBase, { kind: 'ohms', index: place.pnp.base }, whole(pnpBase, pnp.values(p).baseOhms));
  });
  const rail = railIndex(source.railName);
  return (p) => ({
    kind: source.kind,
    rail,
    npn: npn.values(p),
    pnp: pnp.values(p),
    base:
      shared === undefined
        ? {
            npn: npnBase === undefined ? 0 : p[npnBase]!,
            pnp: pnpBase === undefined ? 0 : p[pnpBase]!,
          }
        : { shared: p[shared]! },
  });
}
