/**
 * What drives one terminal of a pump, with bands: the clock's output and, when there is one, the stage behind it.
 */
import type { TransistorData } from '../catalog/part';
import type { Band } from '../quantity/figure';

export interface TransistorSource {
  readonly label: string;
  readonly path: string;
  readonly data: TransistorData;
}

export interface DriverSource {
  readonly kind: 'push-pull' | 'follower';
  readonly name: string;
  readonly path: string;
  readonly railName: string;
  readonly npn: TransistorSource;
  readonly pnp: TransistorSource;
  readonly base: { readonly npn: Band; readonly pnp: Band } | { readonly shared: Band } | undefined;
}

export interface DriveSource {
  /** `mcu.GP15`. */
  readonly label: string;
  readonly path: string;
  readonly railName: string;
  /** Only of an external generator: its high level, V; `railName` is then no rail of the board. */
  readonly highVolts?: Band;
  /** High while the first clock of the pump is low. */
  readonly opposite: boolean;
  readonly highDrop: Band;
  readonly highOhms: Band;
  readonly lowVolts: Band;
  readonly lowOhms: Band;
  readonly driver?: DriverSource;
}
