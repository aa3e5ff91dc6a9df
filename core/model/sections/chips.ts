/**
 * `chips`, and whether a pin that others name exists.
 */
import type { ChipData } from '../../catalog/part';
import { chipShape, pinUseShape } from '../../format';
import { quantityField } from '../../quantity/problem';
import { readQuantity } from '../../quantity/read';
import type { Chip, ChipPin, Draw, PinRef, Ref } from '../board';
import { report } from '../context';
import { entryBase, tableOf } from '../entries';
import { figureOf } from '../figures';
import { chipData } from '../parts/chip';
import { useOf } from '../parts/use';
import { present } from '../present';
import { openMap, type Slot } from '../slot';
import { checkName, nameOf, refOf, reportUnknownName } from '../words';

export function chipsOf(slot: Slot | undefined): Map<string, Chip> {
  const chips = new Map<string, Chip>();
  for (const named of tableOf(slot)) {
    const fields = named.slot && openMap(named.slot, chipShape);
    const part = useOf(fields?.at('part'), 'chips', slot?.context.catalogue.chips ?? [], chipData);
    chips.set(named.name, {
      ...entryBase(named, fields),
      ...present({ part, rail: nameOf(fields?.at('rail')) }),
      draws: drawsOf(fields?.at('draws')),
      pins: pinsOf(fields?.at('pins'), part?.data),
    });
  }
  return chips;
}

function drawsOf(slot: Slot | undefined): Draw[] {
  if (slot?.node.kind !== 'map') {
    const current = figureOf(slot);
    return current ? [{ current }] : [];
  }
  return tableOf(slot).flatMap((named): Draw[] => {
    const mode = { name: named.name, span: named.nameSpan };
    checkName(slot.context, named.path, mode, ['modes']);
    const current = figureOf(named.slot);
    return current ? [{ mode, current }] : [];
  });
}

function pinsOf(slot: Slot | undefined, part: ChipData | undefined): Map<string, ChipPin> {
  const pins = new Map<string, ChipPin>();
  for (const named of tableOf(slot, { emptyIsFine: true })) {
    const fields = named.slot && openMap(named.slot, pinUseShape);
    pins.set(named.name, {
      ...entryBase(named, fields),
      ...present({
        strength: strengthOf(fields?.at('strength'), named.name, part),
        sources: figureOf(fields?.at('sources')),
        sinks: figureOf(fields?.at('sinks')),
      }),
    });
  }
  return pins;
}

/** The setting under the part's own name of it: `12mA` and `12 mA` are one. */
function strengthOf(slot: Slot | undefined, pin: string, part: ChipData | undefined): Ref | undefined {
  const ref = refOf(slot);
  if (!slot || !ref || !part) return ref;
  const settings = Object.keys(
    (Object.hasOwn(part.pin, pin) && part.pin[pin]?.strengths) || part.pins.strengths || {},
  );
  const wanted = comparable(ref.name);
  const setting = settings.find((candidate) => comparable(candidate) === wanted);
  if (setting === undefined)
    reportUnknownName(slot.context, slot.path, ref, `drive setting of ${part.title}`, settings);
  return setting === undefined ? ref : { ...ref, name: setting };
}

function comparable(setting: string): string {
  const reading = readQuantity(setting, quantityField('A'));
  return 'value' in reading ? String(reading.value.band.typical) : setting;
}

/** Reports a pin that neither the board nor the chip's part knows, and a chip whose pins have no data at all. */
export function checkPin(
  slot: Slot | undefined,
  pin: PinRef | undefined,
  chips: ReadonlyMap<string, Chip>,
): void {
  const chip = pin && chips.get(pin.chip);
  if (!slot || !pin || !chip || chip.pins.has(pin.pin)) return;
  if (!chip.part) {
    if (chip.keys.has('part') || slot.context.quiet) return;
    const message = `\`${pin.chip}\` has no \`part\`: without one its pin \`${pin.pin}\` has no output resistance. Name a key of the catalogue or of \`parts\`.`;
    const related = [{ span: pin.span, message: 'The pin is used here.' }];
    report(slot.context, 'missing-key', { path: `${chip.path}.part`, span: chip.nameSpan }, message, {
      related,
    });
    return;
  }
  const { data } = chip.part;
  // Without groups a part lists at most its exceptions: any pin name is possible.
  if (!data || data.groups.length === 0) return;
  const known = [...new Set([...data.groups.flatMap((group) => group.pins), ...Object.keys(data.pin)])];
  if (known.length === 0 || known.includes(pin.pin)) return;
  const place = { name: pin.pin, span: { start: pin.span.end - pin.pin.length, end: pin.span.end } };
  reportUnknownName(slot.context, slot.path, place, `pin of ${data.title}`, known);
}
