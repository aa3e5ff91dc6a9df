/**
 * A rail's `pump`: capacitors and diodes that a clock lifts.
 */
import { pumpShape } from '../../format';
import { listNames } from '../../text/closest';
import type { Diode, Pump, Ref, Topology } from '../board';
import { report } from '../context';
import { listOf } from '../entries';
import { figureOf } from '../figures';
import { diodeData } from '../parts/diode';
import { useOf } from '../parts/use';
import { present } from '../present';
import { type Fields, join, openMap, type Slot } from '../slot';
import { choiceOf, nameOf } from '../words';
import { capacitorOf, capacitorsOf } from './capacitors';

export function pumpOf(slot: Slot | undefined): Pump | undefined {
  const fields = slot && openMap(slot, pumpShape);
  if (!fields) return undefined;
  const topology = choiceOf(fields.at('topology'));
  checkInput(slot, fields, topology?.name);
  checkReservoir(slot, fields, topology?.name);
  // In the order in which people write them: what is assumed is said at the first capacitor without a kind.
  const flying = capacitorsOf(fields.at('flying'));
  const smoothing = capacitorsOf(fields.at('smoothing'));
  return {
    span: fields.span,
    keys: fields.keys,
    ...present({
      topology: topology?.name as Topology | undefined,
      topologySpan: topology?.span,
      stages: figureOf(fields.at('stages')),
      input: nameOf(fields.at('input')),
      reservoir: capacitorOf(fields.at('reservoir')),
      series: figureOf(fields.at('series')),
    }),
    polarity:
      choiceOf(fields.at('polarity'))?.name === 'negative' || topology?.name === 'inverter'
        ? 'negative'
        : 'positive',
    drive: driveOf(fields.at('drive')),
    flying,
    smoothing,
    diodes: diodesOf(fields.at('diode')),
  };
}

/** One phase, or two. */
function driveOf(slot: Slot | undefined): Ref[] {
  if (!slot) return [];
  const phases = slot.node.kind === 'list' ? listOf(slot) : [slot];
  const third = phases[2];
  if (third) report(slot.context, 'bad-quantity', third, 'A pump has one phase, or two: delete the others.');
  return phases.flatMap((phase) => nameOf(phase) ?? []);
}

function diodesOf(slot: Slot | undefined): Diode[] {
  if (!slot) return [];
  const positions = slot.node.kind === 'list' ? listOf(slot) : [slot];
  return positions.flatMap((position): Diode[] => {
    const use = useOf(position, 'diodes', slot.context.catalogue.diodes, diodeData);
    return use ? [{ ...use, path: position.path }] : [];
  });
}

/** An inverter stands on ground by itself; whatever pumps up must say where it starts. */
function checkInput(slot: Slot, { keys, path }: Fields, topology: string | undefined): void {
  if (keys.has('input') || topology === undefined || topology === 'inverter') return;
  const rails = [...slot.context.names.rails.keys()];
  const message = `\`input\` is missing: the rail that the ${topology} stands on, one of ${listNames([...rails, 'ground'])}.`;
  report(slot.context, 'missing-key', { path: join(path, 'input'), span: slot.keySpan }, message);
}

/** Only a ladder may do without: its smoothing column is one. */
function checkReservoir(slot: Slot, { keys, path }: Fields, topology: string | undefined): void {
  if (keys.has('reservoir') || topology === 'ladder') return;
  const message = '`reservoir` is missing: the capacitor across the output. For example `reservoir: 10 uF`.';
  report(slot.context, 'missing-key', { path: join(path, 'reservoir'), span: slot.keySpan }, message);
}
