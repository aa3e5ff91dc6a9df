/**
 * Where the volts go: each loss divided by the load current, so that all of them add up to the ideal voltage minus
 * the actual one.
 */
import type { ElementFigures, Solved } from '../engine';
import type { PumpNetwork } from '../pump/network';
import { idealVoltage, type PumpValues } from '../pump/values';
import { driverLoss } from './driver-figures';
import type { DriverFigures, Drop } from './types';

/**
 * In an ideal pump every source delivers the load's charge once for each stage that it feeds. What the sources give
 * beyond that (base currents, cross-conduction, leakage) is heat as well but lowers no voltage: the last but one entry
 * takes it out of the sum again. Empty without a load current.
 */
export function pumpDrops(
  values: PumpValues,
  network: PumpNetwork,
  solved: Solved,
  drivers: readonly (DriverFigures | null)[],
  loadCurrent: number,
): Drop[] {
  if (!(loadCurrent > 0)) return [];
  const powerIn = sum(solved.knowns.map((known) => known.power));
  const powerOut = sum(
    network.loads.map(({ kind, index }) => (kind === 'load' ? solved.loads : solved.resistors)[index]!.loss),
  );
  const ideal = Math.abs(idealVoltage(values));
  const actual = Math.abs(solved.nodes[network.output]!.average);
  const volts = (elements: readonly (ElementFigures | undefined)[]) =>
    sum(elements.map((e) => e?.loss ?? 0)) / loadCurrent;
  const resistors = (list: readonly (number | undefined)[]) =>
    volts(list.map((k) => (k === undefined ? undefined : solved.resistors[k])));
  const driven = network.drives.some((drive) => drive.driver);
  const cross =
    sum(
      values.drives.map(
        (drive, k) => solvedCross(drivers[k]) * (drive.driver ? values.rails[drive.driver.rail]!.volts : 0),
      ),
    ) / loadCurrent;
  const stages =
    sum(network.drives.map((drive) => (drive.driver ? driverLoss(solved, drive.driver) : 0))) / loadCurrent;
  const list: Drop[] = [
    { in: 'source resistance of the rails', volts: resistors(network.rails.map((rail) => rail.resistor)) },
    {
      in: driven ? 'output of the clock' : 'drive',
      volts: resistors(network.drives.flatMap((drive) => [drive.high, drive.low])),
    },
    {
      in: 'base resistors',
      volts: resistors(
        network.drives.flatMap(({ driver }) =>
          driver ? [driver.npn.base, driver.pnp.base, driver.shared] : [],
        ),
      ),
    },
    { in: 'driver', volts: stages - cross },
    { in: 'driver cross-conduction', volts: cross },
    { in: 'series resistor', volts: resistors(network.drives.map((drive) => drive.series)) },
    { in: 'diodes', volts: volts(network.diodes.map((k) => solved.diodes[k])) },
    { in: 'flying capacitor ESR', volts: volts(network.flying.map((k) => solved.capacitors[k])) },
    { in: 'smoothing capacitor ESR', volts: volts(network.smoothing.map((k) => solved.capacitors[k])) },
    {
      in: 'reservoir ESR',
      volts: volts([network.reservoir === undefined ? undefined : solved.capacitors[network.reservoir]]),
    },
    {
      in: driven ? 'current beyond the share of the load' : 'leakage',
      volts: ideal - powerIn / loadCurrent + resistors(allLeaks(network)) + volts(junctions(network, solved)),
    },
    { in: 'ripple', volts: powerOut / loadCurrent - actual },
  ];
  return list.filter((drop) => Math.abs(drop.volts) > 1e-5 * ideal);
}

/** Without the overlap after an edge, which is not in the network. */
function solvedCross(driver: DriverFigures | null | undefined): number {
  return driver ? driver.crossCurrent - driver.overlapCurrent : 0;
}

function allLeaks({ leaks }: PumpNetwork): readonly (number | undefined)[] {
  return [...leaks.flying, ...leaks.smoothing, leaks.reservoir, ...leaks.diodes];
}

function junctions(network: PumpNetwork, solved: Solved): readonly (ElementFigures | undefined)[] {
  return network.junctions.map((k) => (k === undefined ? undefined : solved.capacitors[k]));
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}
