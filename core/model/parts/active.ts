/**
 * Data of transistors, gates and timers from the file: the parts of driver stages and oscillators.
 */
import type { GateData, MosfetData, TimerData, TransistorData } from '../../catalog/part';
import { gatePartShape, mosfetPartShape, timerPartShape, transistorPartShape } from '../../format';
import { present } from '../present';
import { openMap, type Slot } from '../slot';
import { choiceOf } from '../words';
import { outputData } from './chip';
import { entryHead, missingFigure, partFigure, standIn } from './figures';

export function transistorData(slot: Slot, key: string, base?: TransistorData): TransistorData | undefined {
  const fields = openMap(slot, transistorPartShape);
  if (!fields) return undefined;
  const head = entryHead(key, slot, fields, base);
  const { source } = head;
  const written = choiceOf(fields.at('polarity'))?.name;
  const polarity = written === 'npn' || written === 'pnp' ? written : base?.polarity;
  if (!polarity) {
    if (!fields.keys.has('polarity')) missingFigure(slot, 'polarity', 'npn or pnp', 'npn');
    return undefined;
  }
  const like = slot.context.catalogue.transistors.find((entry) => entry.polarity === polarity);
  const typical = standIn(slot, like);
  const saturation =
    partFigure(fields, 'saturation', base?.saturation, source) ??
    typical.take('saturation', like?.saturation);
  const gain = partFigure(fields, 'gain', base?.gain, source) ?? typical.take('gain', like?.gain);
  typical.report();
  if (!saturation || !gain) return undefined;
  return {
    ...base,
    ...head,
    polarity,
    saturation,
    gain,
    ...present({
      reverseGain: partFigure(fields, 'reverse-gain', base?.reverseGain, source),
      baseResistance: partFigure(fields, 'base-resistance', base?.baseResistance, source),
      collectorResistance: partFigure(fields, 'collector-resistance', base?.collectorResistance, source),
      emitterResistance: partFigure(fields, 'emitter-resistance', base?.emitterResistance, source),
      storage: partFigure(fields, 'storage', base?.storage, source),
      current: partFigure(fields, 'current', base?.current, source),
    }),
  };
}

export function mosfetData(slot: Slot, key: string, base?: MosfetData): MosfetData | undefined {
  const fields = openMap(slot, mosfetPartShape);
  if (!fields) return undefined;
  const head = entryHead(key, slot, fields, base);
  const { source } = head;
  const written = choiceOf(fields.at('channel'))?.name;
  const channel = written === 'n' || written === 'p' ? written : base?.channel;
  if (!channel) {
    if (!fields.keys.has('channel')) missingFigure(slot, 'channel', 'n or p', 'n');
    return undefined;
  }
  const like = slot.context.catalogue.mosfets.find((entry) => entry.channel === channel);
  const typical = standIn(slot, like);
  const threshold =
    partFigure(fields, 'threshold', base?.threshold, source) ?? typical.take('threshold', like?.threshold);
  const onResistance =
    partFigure(fields, 'on-resistance', base?.onResistance, source) ??
    typical.take('on-resistance', like?.onResistance);
  typical.report();
  if (!threshold || !onResistance) return undefined;
  return {
    ...base,
    ...head,
    channel,
    threshold,
    onResistance,
    ...present({
      gateCharge: partFigure(fields, 'gate-charge', base?.gateCharge, source),
      current: partFigure(fields, 'current', base?.current, source),
    }),
  };
}

export function gateData(slot: Slot, key: string, base?: GateData): GateData | undefined {
  const fields = openMap(slot, gatePartShape);
  if (!fields) return undefined;
  const head = entryHead(key, slot, fields, base);
  const { source } = head;
  return {
    ...base,
    ...head,
    output: outputData(fields, base?.output),
    ...present({
      supply: partFigure(fields, 'supply', base?.supply, source),
      absolute: partFigure(fields, 'absolute', base?.absolute, source),
      total: partFigure(fields, 'total', base?.total, source),
      rising: partFigure(fields, 'rising', base?.rising, source),
      falling: partFigure(fields, 'falling', base?.falling, source),
      draws: partFigure(fields, 'draws', base?.draws, source),
    }),
  };
}

export function timerData(slot: Slot, key: string, base?: TimerData): TimerData | undefined {
  const fields = openMap(slot, timerPartShape);
  if (!fields) return undefined;
  const head = entryHead(key, slot, fields, base);
  const { source } = head;
  return {
    ...base,
    ...head,
    ...present({
      supply: partFigure(fields, 'supply', base?.supply, source),
      highDrop: partFigure(fields, 'high-drop', base?.highDrop, source),
      highResistance: partFigure(fields, 'high-resistance', base?.highResistance, source),
      lowVoltage: partFigure(fields, 'low-voltage', base?.lowVoltage, source),
      lowResistance: partFigure(fields, 'low-resistance', base?.lowResistance, source),
      draws: partFigure(fields, 'draws', base?.draws, source),
      fastest: partFigure(fields, 'fastest', base?.fastest, source),
    }),
  };
}
