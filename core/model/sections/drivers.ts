/**
 * `drivers`: stages between a clock and a pump.
 */

import type { MosfetData, TransistorData } from '../../catalog/part';
import {
  baseShape,
  driverShape,
  followerShape,
  gatesShape,
  mosfetPairShape,
  pushPullShape,
} from '../../format';
import type { Chip, Driver, DriverStage, Use } from '../board';
import { entryBase, listOf, tableOf } from '../entries';
import { figureOf } from '../figures';
import { gateData, mosfetData, transistorData } from '../parts/active';
import { useOf } from '../parts/use';
import { present } from '../present';
import { type Fields, openMap, type Slot } from '../slot';
import { nameOf, pinOf } from '../words';
import { checkPin } from './chips';

export function driversOf(slot: Slot | undefined, chips: ReadonlyMap<string, Chip>): Map<string, Driver> {
  const drivers = new Map<string, Driver>();
  for (const named of tableOf(slot, { what: 'driver' })) {
    const fields = named.slot && openMap(named.slot, driverShape);
    drivers.set(named.name, {
      ...entryBase(named, fields),
      ...present({
        input: nameOf(fields?.at('input')),
        rail: nameOf(fields?.at('rail')),
        stage: fields && stageOf(fields, chips),
      }),
    });
  }
  return drivers;
}

type StageKey = 'push-pull' | 'follower' | 'mosfet-pair' | 'gates' | 'pins';

/** The first stage that stands there; a second one is reported where the map is opened. */
function stageOf(fields: Fields<StageKey>, chips: ReadonlyMap<string, Chip>): DriverStage | undefined {
  return (
    pushPull(fields.at('push-pull')) ??
    follower(fields.at('follower')) ??
    mosfetPair(fields.at('mosfet-pair')) ??
    gates(fields.at('gates')) ??
    pins(fields.at('pins'), chips)
  );
}

function pushPull(slot: Slot | undefined): DriverStage | undefined {
  const fields = slot && openMap(slot, pushPullShape);
  if (!fields) return undefined;
  const base = fields.at('base') && openMap(fields.at('base')!, baseShape);
  return {
    kind: 'push-pull',
    span: fields.span,
    ...present({
      npn: transistor(fields.at('npn')),
      pnp: transistor(fields.at('pnp')),
      base: base && present({ npn: figureOf(base.at('npn')), pnp: figureOf(base.at('pnp')) }),
      sharedBase: figureOf(fields.at('shared-base')),
    }),
  };
}

function follower(slot: Slot | undefined): DriverStage | undefined {
  const fields = slot && openMap(slot, followerShape);
  return (
    fields && {
      kind: 'follower',
      span: fields.span,
      ...present({ npn: transistor(fields.at('npn')), pnp: transistor(fields.at('pnp')) }),
    }
  );
}

function mosfetPair(slot: Slot | undefined): DriverStage | undefined {
  const fields = slot && openMap(slot, mosfetPairShape);
  return (
    fields && {
      kind: 'mosfet-pair',
      span: fields.span,
      ...present({
        nmos: mosfet(fields.at('nmos')),
        pmos: mosfet(fields.at('pmos')),
        gate: figureOf(fields.at('gate')),
      }),
    }
  );
}

function gates(slot: Slot | undefined): DriverStage | undefined {
  const fields = slot && openMap(slot, gatesShape);
  return (
    fields && {
      kind: 'gates',
      span: fields.span,
      ...present({
        part: useOf(fields.at('part'), 'gates', slot.context.catalogue.gates, gateData),
        parallel: figureOf(fields.at('parallel')),
      }),
    }
  );
}

function pins(slot: Slot | undefined, chips: ReadonlyMap<string, Chip>): DriverStage | undefined {
  if (!slot) return undefined;
  const named = listOf(slot, true).flatMap((item) => {
    const pin = pinOf(item);
    checkPin(item, pin, chips);
    return pin ?? [];
  });
  return { kind: 'pins', span: slot.span, pins: named };
}

function transistor(slot: Slot | undefined): Use<TransistorData> | undefined {
  return useOf(slot, 'transistors', slot?.context.catalogue.transistors ?? [], transistorData);
}

function mosfet(slot: Slot | undefined): Use<MosfetData> | undefined {
  return useOf(slot, 'mosfets', slot?.context.catalogue.mosfets ?? [], mosfetData);
}
