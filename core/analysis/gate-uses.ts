/**
 * Gates of MOSFETs as a load of the clocks that drive them, and what their edges take from the driver's rail: once for
 * each driver, however many pumps it lifts.
 */
import type { DriveChain } from './drive-chain';
import type { GateLoad } from './mosfet-stage';

export interface GateUse {
  readonly driver: string;
  /** Rail of the driver. */
  readonly railName: string;
  /** Rail behind the clock's output; absent for an external generator. */
  readonly clockRail: string | undefined;
  /** Pin that is the clock's output. */
  readonly pin: { readonly chip: string; readonly pin: string } | undefined;
  readonly load: GateLoad;
}

export function gateUses(chains: Iterable<readonly DriveChain[]>): readonly GateUse[] {
  const uses = new Map<string, GateUse>();
  for (const list of chains)
    for (const { driver, gates, source, clock } of list) {
      if (!driver || !gates?.load || uses.has(driver.name)) continue;
      uses.set(driver.name, {
        driver: driver.name,
        railName: source.railName,
        clockRail: clock.output.railName,
        pin: clock.pin && { chip: clock.pin.chip.name, pin: clock.pin.pin },
        load: gates.load,
      });
    }
  return [...uses.values()];
}
