/**
 * `stock`: what may be used when a rail is sized.
 */
import { stockShape } from '../../format';
import type { Stock } from '../board';
import { listOf } from '../entries';
import { figureOf } from '../figures';
import { lookUp } from '../parts/use';
import { present } from '../present';
import { type Fields, openMap, type Slot } from '../slot';
import { choiceOf, nameOf, textOf } from '../words';

type Keys = keyof typeof stockShape.keys;

export function stockOf(slot: Slot | undefined): Stock {
  const fields = slot && openMap(slot, stockShape);
  if (!fields) return {};
  const { catalogue } = slot!.context;
  const series = choiceOf(fields.at('series'))?.name;
  return present({
    series: series === 'E3' || series === 'E6' || series === 'E12' || series === 'E24' ? series : undefined,
    capacitors: figures(fields, 'capacitors'),
    kinds: parts(fields, 'kinds', catalogue.capacitors, 'kind of capacitor'),
    rated: figures(fields, 'rated'),
    diodes: parts(fields, 'diodes', catalogue.diodes, 'diode'),
    transistors: parts(fields, 'transistors', catalogue.transistors, 'transistor'),
    gates: parts(fields, 'gates', catalogue.gates, 'gate'),
    mosfets: parts(fields, 'mosfets', catalogue.mosfets, 'MOS transistor'),
    stages: figureOf(fields.at('stages')),
    frequencies: figures(fields, 'frequencies'),
    preferred:
      given(fields, 'preferred') && listOf(fields.at('preferred')).flatMap((item) => textOf(item) ?? []),
    rails: given(fields, 'rails') && listOf(fields.at('rails')).flatMap((item) => nameOf(item)?.name ?? []),
  });
}

function given(fields: Fields<Keys>, key: Keys): true | undefined {
  return fields.at(key) ? true : undefined;
}

function figures(fields: Fields<Keys>, key: Keys): readonly number[] | undefined {
  return given(fields, key) && listOf(fields.at(key)).flatMap((item) => figureOf(item)?.typical ?? []);
}

function parts<T extends { readonly key: string; readonly title: string; readonly source: string }>(
  fields: Fields<Keys>,
  key: Keys,
  list: readonly T[],
  what: string,
): readonly T[] | undefined {
  return given(fields, key) && listOf(fields.at(key)).flatMap((item) => lookUp(item, list, what)?.data ?? []);
}
