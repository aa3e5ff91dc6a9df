/**
 * A number that is not there, and why.
 */
import type { Finding } from '../checks/finding';

export interface Gap {
  /** One clause, for a reader: `its driver buffer is not computed yet`. */
  readonly because: string;
  /** What the computation has to report about it, when nobody else does. */
  readonly finding?: Finding;
}

export function isGap(value: object): value is Gap {
  return 'because' in value;
}
