/**
 * `rails`: nets with a voltage, and where it comes from.
 */
import { filterShape, railShape, regulatorShape } from '../../format';
import type { Filter, Rail, RailOrigin, Regulator } from '../board';
import { entryBase, tableOf } from '../entries';
import { figureOf } from '../figures';
import { present } from '../present';
import { type Fields, openMap, type Slot } from '../slot';
import { choiceOf, nameOf } from '../words';
import { capacitorOf } from './capacitors';
import { loadsOf, needsOf } from './loads';
import { pumpOf } from './pump';

export function railsOf(slot: Slot | undefined): Map<string, Rail> {
  const rails = new Map<string, Rail>();
  for (const named of tableOf(slot)) {
    const fields = named.slot && openMap(named.slot, railShape);
    rails.set(named.name, {
      ...entryBase(named, fields),
      ...present({
        origin: fields && originOf(fields),
        needs: needsOf(fields?.at('needs')),
        bleeder: figureOf(fields?.at('bleeder')),
      }),
      loads: loadsOf(fields?.at('loads')),
    });
  }
  return rails;
}

/** The first origin that stands there; a second one is reported where the map is opened. */
function originOf(fields: Fields<'supply' | 'regulator' | 'pump' | 'filter'>): RailOrigin | undefined {
  const supply = nameOf(fields.at('supply'));
  const regulator = regulatorOf(fields.at('regulator'));
  const pump = pumpOf(fields.at('pump'));
  const filter = filterOf(fields.at('filter'));
  if (supply) return { kind: 'supply', supply };
  if (regulator) return { kind: 'regulator', regulator };
  if (pump) return { kind: 'pump', pump };
  return filter && { kind: 'filter', filter };
}

function regulatorOf(slot: Slot | undefined): Regulator | undefined {
  const fields = slot && openMap(slot, regulatorShape);
  if (!fields) return undefined;
  const kind = choiceOf(fields.at('kind'))?.name;
  return {
    span: fields.span,
    keys: fields.keys,
    ...present({
      from: nameOf(fields.at('from')),
      output: figureOf(fields.at('output')),
      dropout: figureOf(fields.at('dropout')),
      ground: figureOf(fields.at('ground')),
      limit: figureOf(fields.at('limit')),
      kind: kind === 'linear' || kind === 'switching' ? kind : undefined,
      efficiency: figureOf(fields.at('efficiency')),
      thermal: figureOf(fields.at('thermal')),
    }),
  };
}

function filterOf(slot: Slot | undefined): Filter | undefined {
  const fields = slot && openMap(slot, filterShape);
  return (
    fields && {
      span: fields.span,
      keys: fields.keys,
      ...present({
        from: nameOf(fields.at('from')),
        resistor: figureOf(fields.at('resistor')),
        inductor: figureOf(fields.at('inductor')),
        capacitor: capacitorOf(fields.at('capacitor')),
      }),
    }
  );
}
