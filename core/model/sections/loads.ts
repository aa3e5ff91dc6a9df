/**
 * A rail's `loads` and `needs`.
 */
import { amplifierShape, loadShape, needsShape } from '../../format';
import type { Load, Needs } from '../board';
import { reportNotComputed } from '../context';
import { entryBase, listOf, type Named, tableOf } from '../entries';
import { figureOf } from '../figures';
import { present } from '../present';
import { openMap, type Slot } from '../slot';
import { nameOf } from '../words';

export function loadsOf(slot: Slot | undefined): Map<string, Load> {
  const loads = new Map<string, Load>();
  for (const named of tableOf(slot)) {
    const load = named.slot?.node.kind === 'map' ? loadMap(named, named.slot) : bareLoad(named);
    loads.set(named.name, load);
  }
  return loads;
}

/** The unit tells which kind of load it is. */
function bareLoad(named: Named): Load {
  const figure = figureOf(named.slot);
  const base = entryBase(named, undefined);
  if (!figure || !named.slot) return base;
  if (figure.unit === 'A') return { ...base, current: figure };
  if (figure.unit === 'ohm') return { ...base, resistance: figure };
  if (!loadShape.keys.power.computed) {
    const place = { path: named.path, span: figure.span ?? named.nameSpan };
    reportNotComputed(named.slot.context, place, 'A load given as a power');
  }
  return { ...base, power: figure };
}

function loadMap(named: Named, slot: Slot): Load {
  const fields = openMap(slot, loadShape);
  const modes = fields?.at('in');
  return {
    ...entryBase(named, fields),
    ...present({
      current: figureOf(fields?.at('current')),
      resistance: figureOf(fields?.at('resistance')),
      power: figureOf(fields?.at('power')),
      modes: modes && listOf(modes, true).flatMap((item) => nameOf(item) ?? []),
      least: figureOf(fields?.at('least')),
      most: figureOf(fields?.at('most')),
      amplifier: amplifierOf(fields?.at('amplifier')),
    }),
  };
}

function amplifierOf(slot: Slot | undefined): Load['amplifier'] {
  const fields = slot && openMap(slot, amplifierShape);
  return (
    fields && {
      span: fields.span,
      ...present({
        quiescent: figureOf(fields.at('quiescent')),
        output: figureOf(fields.at('output')),
        count: figureOf(fields.at('count')),
      }),
    }
  );
}

export function needsOf(slot: Slot | undefined): Needs | undefined {
  const fields = slot && openMap(slot, needsShape);
  if (!fields) return undefined;
  return {
    span: fields.span,
    keys: fields.keys,
    ...present({
      voltage: figureOf(fields.at('voltage')),
      ripple: figureOf(fields.at('ripple')),
      start: figureOf(fields.at('start')),
      swing: figureOf(fields.at('swing')),
      headroom: figureOf(fields.at('headroom')),
      discharge: figureOf(fields.at('discharge')),
    }),
  };
}
