/**
 * Capacitors wherever they stand: a bare value, or a map; the kind and its series resistance filled in.
 */
import type { CapacitorKind } from '../../catalog/part';
import { capacitorShape } from '../../format';
import { type Figure, figure } from '../../quantity/figure';
import type { Capacitor } from '../board';
import { report } from '../context';
import { listOf } from '../entries';
import { figureOf, readFigure } from '../figures';
import { capacitorKind } from '../parts/diode';
import { useOf } from '../parts/use';
import { present } from '../present';
import { openMap, type Slot } from '../slot';
import { nameOf, refOf } from '../words';

/** Up to here a capacitor without a kind is taken as ceramic, above as aluminium. Common practice. */
const largestCeramicF = 22e-6;
/** Loss factors are stated at this frequency. */
const lossFrequencyHz = 120;

/** One for all stages, or one for each. */
export function capacitorsOf(slot: Slot | undefined): Capacitor[] {
  if (!slot) return [];
  if (slot.node.kind !== 'list') return [capacitorOf(slot) ?? []].flat();
  return listOf(slot).flatMap((item) => capacitorOf(item) ?? []);
}

export function capacitorOf(slot: Slot | undefined): Capacitor | undefined {
  if (!slot) return undefined;
  const { context, path, span } = slot;
  const fields = slot.node.kind === 'map' ? openMap(slot, capacitorShape) : undefined;
  if (slot.node.kind === 'map' && !fields) return undefined;
  const reading = readFigure(fields ? fields.at('value') : slot);
  const value = reading?.figure;
  const given = useOf(fields?.at('kind'), 'capacitors', context.catalogue.capacitors, capacitorKind);
  const kind = given ? { ...given, assumed: false } : assumedKind(slot, value);
  const rated = figureOf(fields?.at('rated'));
  if (kind.data?.bias && !rated && value) sayUnrated(slot, kind.data);
  const esr = figureOf(fields?.at('esr')) ?? (kind.data && value && typicalEsr(kind.data, value));
  return {
    span,
    path,
    toleranceGiven: reading?.toleranceGiven ?? false,
    kind,
    ...present({
      value,
      rated,
      esr,
      ripple: figureOf(fields?.at('ripple')),
      size: refOf(fields?.at('size')),
      negativeTo: nameOf(fields?.at('negative-to')),
    }),
  };
}

/** Once for the file: without a rating nothing says how much of the value the direct voltage leaves. */
function sayUnrated({ context, path, span }: Slot, kind: CapacitorKind): void {
  if (context.quiet || context.said.has('rated')) return;
  context.said.add('rated');
  report(
    context,
    'assumed',
    { path, span },
    `This \`${kind.key}\` capacitor has no \`rated\`: it is taken to keep its value under direct voltage, which ceramics of this class do not. Write the rated voltage, for example \`rated: 16 V\`.`,
  );
}

function assumedKind(slot: Slot, value: Figure | undefined): Capacitor['kind'] {
  const { context, path, span } = slot;
  const key = value && value.typical > largestCeramicF * (1 + 1e-9) ? 'aluminium' : 'x7r';
  const data = context.catalogue.capacitors.find((entry) => entry.key === key);
  if (value && !context.quiet && !context.said.has('kind')) {
    context.said.add('kind');
    const rule =
      'Kinds that are left out are `x7r` up to 22 uF and `aluminium` above, with the typical series resistance of the kind.';
    report(
      context,
      'assumed',
      { path, span },
      `This capacitor has no \`kind\`: it is taken as \`${key}\`. ${rule}`,
    );
  }
  return { span, assumed: true, ...(data && { data }) };
}

/** ESR from the kind: as stated, or from the loss factor, tan delta / (2 pi f C). */
function typicalEsr(kind: CapacitorKind, value: Figure): Figure | undefined {
  if (kind.esr) return kind.esr;
  if (!kind.loss || !(value.min > 0)) return undefined;
  const resistance = (loss: number, farad: number) => loss / (2 * Math.PI * lossFrequencyHz * farad);
  const band = {
    min: resistance(kind.loss.min, value.max),
    typical: resistance(kind.loss.typical, value.typical),
    max: resistance(kind.loss.max, value.min),
  };
  return figure(band, 'ohm', {
    kind: 'derived',
    note: `loss factor of ${kind.title} at ${lossFrequencyHz} Hz`,
  });
}
