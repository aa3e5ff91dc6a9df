/**
 * `clocks`: square waves.
 */
import { astableShape, clockShape, externalShape, registersShape, schmittShape } from '../../format';
import { type Figure, figure } from '../../quantity/figure';
import type { Chip, Clock, TimerRegisters } from '../board';
import { report } from '../context';
import { entryBase, type Named, tableOf } from '../entries';
import { figureOf } from '../figures';
import { gateData, timerData } from '../parts/active';
import { useOf } from '../parts/use';
import { present } from '../present';
import { type Fields, join, openMap, type Slot } from '../slot';
import { nameOf, pinOf } from '../words';
import { checkPin } from './chips';

export function clocksOf(slot: Slot | undefined, chips: ReadonlyMap<string, Chip>): Map<string, Clock> {
  const clocks = new Map<string, Clock>();
  for (const named of tableOf(slot)) {
    const fields = named.slot && openMap(named.slot, clockShape);
    const pin = pinOf(fields?.at('pin'));
    checkPin(fields?.at('pin'), pin, chips);
    if (fields && named.slot) checkFrequency(named.slot, fields);
    clocks.set(named.name, {
      ...entryBase(named, fields),
      ...present({
        pin,
        frequency: figureOf(fields?.at('frequency')),
        duty: fields && dutyOf(named, fields),
        timer: registersOf(fields?.at('timer')),
        astable: astableOf(fields?.at('astable')),
        schmitt: schmittOf(fields?.at('schmitt')),
        external: externalOf(fields?.at('external')),
        rail: nameOf(fields?.at('rail')),
        rise: figureOf(fields?.at('rise')),
        fall: figureOf(fields?.at('fall')),
        inverseOf: nameOf(fields?.at('inverse-of')),
      }),
    });
  }
  return clocks;
}

/** A pin needs a frequency from somewhere: given, from the timer's registers, or from the clock it inverts. */
function checkFrequency(slot: Slot, { keys, path }: Fields): void {
  if (!keys.has('pin') || keys.has('frequency') || keys.has('timer') || keys.has('inverse-of')) return;
  const place = { path: join(path, 'frequency'), span: slot.keySpan };
  const message =
    '`frequency` is missing: a clock at a pin needs it, or `timer` with its registers. For example `frequency: 100 kHz`.';
  report(slot.context, 'missing-key', place, message);
}

/** Half of the period is the usual square wave, said once for each clock that leaves it open. */
function dutyOf(named: Named, fields: Fields<'duty'>): Figure | undefined {
  const given = figureOf(fields.at('duty'));
  const followed = ['timer', 'astable', 'schmitt', 'external', 'inverse-of'].some((key) =>
    fields.keys.has(key),
  );
  if (given || fields.keys.has('duty') || followed || !named.slot) return given;
  const place = { path: join(named.path, 'duty'), span: named.nameSpan };
  report(
    named.slot.context,
    'assumed',
    place,
    `\`duty\` is left out: clock \`${named.name}\` is taken as high for 50 % of its period.`,
  );
  return figure(0.5, '1', { kind: 'assumed', note: 'half of the period' });
}

function registersOf(slot: Slot | undefined): TimerRegisters | undefined {
  const fields = slot && openMap(slot, registersShape);
  return (
    fields && {
      span: fields.span,
      ...present({
        input: figureOf(fields.at('input')),
        prescaler: figureOf(fields.at('prescaler')),
        top: figureOf(fields.at('top')),
        compare: figureOf(fields.at('compare')),
      }),
    }
  );
}

function astableOf(slot: Slot | undefined): Clock['astable'] {
  const fields = slot && openMap(slot, astableShape);
  return (
    fields && {
      span: fields.span,
      ...present({
        charge: figureOf(fields.at('charge')),
        discharge: figureOf(fields.at('discharge')),
        timing: figureOf(fields.at('timing')),
        part: useOf(fields.at('part'), 'timers', slot.context.catalogue.timers, timerData),
      }),
    }
  );
}

function schmittOf(slot: Slot | undefined): Clock['schmitt'] {
  const fields = slot && openMap(slot, schmittShape);
  return (
    fields && {
      span: fields.span,
      ...present({
        resistor: figureOf(fields.at('resistor')),
        capacitor: figureOf(fields.at('capacitor')),
        part: useOf(fields.at('part'), 'gates', slot.context.catalogue.gates, gateData),
      }),
    }
  );
}

function externalOf(slot: Slot | undefined): Clock['external'] {
  const fields = slot && openMap(slot, externalShape);
  return (
    fields && {
      span: fields.span,
      ...present({
        frequency: figureOf(fields.at('frequency')),
        duty: figureOf(fields.at('duty')),
        high: figureOf(fields.at('high')),
        low: figureOf(fields.at('low')),
        resistance: figureOf(fields.at('resistance')),
      }),
    }
  );
}
