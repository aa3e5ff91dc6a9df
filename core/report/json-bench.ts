/**
 * A bench entry in the report: what was measured and predicted, and what would explain the difference.
 */
import type { BenchResult } from '../analysis/types';
import { band, finite } from './plain';
import type { BenchReport } from './report';

export function benchReport({
  point,
  predicted,
  voltage,
  ripple,
  inside,
  explanation,
}: BenchResult): BenchReport {
  const { load } = point;
  const explained = explanation?.();
  return {
    rail: point.rail?.name ?? null,
    load: finite(load?.typical),
    unit: load ? (load.unit === 'ohm' ? 'ohm' : 'A') : null,
    measured: { voltage: finite(point.voltage?.typical), ripple: finite(point.ripple?.typical) },
    predicted: { voltage: band(predicted?.voltage ?? null), ripple: band(predicted?.ripple ?? null) },
    deviation: { voltage: finite(voltage?.deviation), ripple: finite(ripple?.deviation) },
    inside,
    explained: (explained?.moves ?? []).map(({ label, path, value, unit, typical, explains, both }) => ({
      by: label,
      at: path,
      value,
      unit,
      typical,
      explains: both ? 'both' : explains,
    })),
    together: explained?.together ?? false,
    note: point.note ?? null,
  };
}
