/**
 * `supplies` and `modes`: the sections that stand on nothing else.
 */
import { modeShape, supplyShape } from '../../format';
import { formatPercent } from '../../quantity/write';
import type { Mode, Supply } from '../board';
import { report } from '../context';
import { entryBase, tableOf } from '../entries';
import { figureOf } from '../figures';
import { lookUp } from '../parts/use';
import { present } from '../present';
import { openMap, type Slot } from '../slot';

export function suppliesOf(slot: Slot | undefined): Map<string, Supply> {
  const supplies = new Map<string, Supply>();
  for (const named of tableOf(slot)) {
    const fields = named.slot && openMap(named.slot, supplyShape);
    const catalogue = slot?.context.catalogue;
    supplies.set(named.name, {
      ...entryBase(named, fields),
      ...(fields &&
        present({
          standard: lookUp(fields.at('standard'), catalogue?.standards ?? [], 'port standard'),
          battery: lookUp(fields.at('battery'), catalogue?.batteries ?? [], 'kind of battery'),
          cells: figureOf(fields.at('cells')),
          voltage: figureOf(fields.at('voltage')),
          current: figureOf(fields.at('current')),
          resistance: figureOf(fields.at('resistance')),
          capacity: figureOf(fields.at('capacity')),
          life: figureOf(fields.at('life')),
          bulk: figureOf(fields.at('bulk')),
        })),
    });
  }
  return supplies;
}

export function modesOf(slot: Slot | undefined): Map<string, Mode> {
  const modes = new Map<string, Mode>();
  let sum = 0;
  for (const named of tableOf(slot)) {
    const fields = named.slot && openMap(named.slot, modeShape);
    const share = figureOf(fields?.at('share'));
    sum += share?.typical ?? 0;
    modes.set(named.name, { ...entryBase(named, fields), ...present({ share }) });
  }
  if (slot && sum > 1 + 1e-6) {
    const message = `The shares of all modes add up to ${formatPercent(sum)}: together they must not be above 100 %.`;
    report(slot.context, 'bad-quantity', { path: slot.path, span: slot.keySpan }, message);
  }
  return modes;
}
