/**
 * Data of diodes and of kinds of capacitors from the file: the parts of a pump itself.
 */
import type { CapacitorKind, DiodeData } from '../../catalog/part';
import { biasShape, capacitorPartShape, diodePartShape } from '../../format';
import { listOf } from '../entries';
import { figureOf } from '../figures';
import { present } from '../present';
import { openMap, type Slot } from '../slot';
import { choiceOf } from '../words';
import { entryHead, missingFigure, partFigure, standIn } from './figures';

/** Undefined when the saturation current is missing: nothing can stand in for it. */
export function diodeData(slot: Slot, key: string, base?: DiodeData): DiodeData | undefined {
  const fields = openMap(slot, diodePartShape);
  if (!fields) return undefined;
  const head = entryHead(key, slot, fields, base);
  const { source } = head;
  const written = choiceOf(fields.at('kind'))?.name;
  const kind = written === 'schottky' || written === 'silicon' ? written : (base?.kind ?? 'silicon');
  const like = slot.context.catalogue.diodes.find((entry) => entry.kind === kind);
  const typical = standIn(slot, like);
  const saturation = partFigure(fields, 'saturation', base?.saturation, source);
  if (!saturation) {
    if (!fields.keys.has('saturation'))
      missingFigure(slot, 'saturation', 'the current that sets the forward voltage', '2.5 nA');
    return undefined;
  }
  const ideality =
    partFigure(fields, 'ideality', base?.ideality, source) ?? typical.take('ideality', like?.ideality);
  const resistance =
    partFigure(fields, 'resistance', base?.resistance, source) ??
    typical.take('resistance', like?.resistance);
  typical.report();
  if (!ideality) missingFigure(slot, 'ideality', 'the steepness of the forward current', '1.8');
  if (!resistance) missingFigure(slot, 'resistance', 'the series resistance', '0.6 ohm');
  if (!ideality || !resistance) return undefined;
  return {
    ...base,
    ...head,
    kind,
    saturation,
    ideality,
    resistance,
    ...present({
      junction: partFigure(fields, 'junction', base?.junction, source),
      reverse: partFigure(fields, 'reverse', base?.reverse, source),
      average: partFigure(fields, 'average', base?.average, source),
      peak: partFigure(fields, 'peak', base?.peak, source),
      leakage: partFigure(fields, 'leakage', base?.leakage, source),
    }),
  };
}

/** Undefined when the tolerance is missing. Resistance and loss factor exclude each other: the file's one counts. */
export function capacitorKind(slot: Slot, key: string, base?: CapacitorKind): CapacitorKind | undefined {
  const fields = openMap(slot, capacitorPartShape);
  if (!fields) return undefined;
  const head = entryHead(key, slot, fields, base);
  const { source } = head;
  const tolerance = partFigure(fields, 'tolerance', base?.tolerance, source);
  if (!tolerance) {
    if (!fields.keys.has('tolerance'))
      missingFigure(slot, 'tolerance', 'the deviation of the value', '+-20 %');
    return undefined;
  }
  const ownLoss = figureOf(fields.at('loss'));
  const ownEsr = figureOf(fields.at('esr'));
  const polarised = choiceOf(fields.at('polarised'))?.name;
  const bias = listOf(fields.at('bias'), true).flatMap((item) => {
    const point = openMap(item, biasShape);
    const share = figureOf(point?.at('share'))?.typical;
    const left = figureOf(point?.at('left'));
    return share !== undefined && left ? [{ share, left }] : [];
  });
  const { loss, esr, bias: _, ...rest } = base ?? {};
  return {
    ...rest,
    ...head,
    tolerance,
    polarised:
      polarised === undefined ? (base?.polarised ?? false) : polarised === 'yes' || polarised === 'true',
    ...present({
      temperature: partFigure(fields, 'temperature', base?.temperature, source),
      loss: ownLoss ?? (ownEsr ? undefined : loss),
      esr: ownEsr ?? (ownLoss ? undefined : esr),
      bias: bias.length > 0 ? bias : base?.bias,
      leakage: partFigure(fields, 'leakage', base?.leakage, source),
    }),
  };
}
