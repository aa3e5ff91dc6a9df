/**
 * The names of all sections, known before anything is read, so that entries may stand in any order.
 */
import type { NameSpace } from '../format';
import type { MapNode, Node } from '../syntax/node';
import type { Span } from '../text/span';
import type { Context } from './context';

export function namesOf(root: Node | undefined): Pick<Context, 'names' | 'nameLists'> {
  const section = (name: NameSpace): ReadonlyMap<string, Span> => {
    const node = root?.kind === 'map' ? find(root, name) : undefined;
    if (node?.kind !== 'map') return new Map();
    return new Map(node.entries.map((entry) => [entry.key.text, entry.key.span]));
  };
  const names = bySection(section);
  return { names, nameLists: bySection((name) => [...names[name].keys()]) };
}

function bySection<T>(value: (name: NameSpace) => T): Readonly<Record<NameSpace, T>> {
  return {
    supplies: value('supplies'),
    chips: value('chips'),
    clocks: value('clocks'),
    drivers: value('drivers'),
    rails: value('rails'),
    modes: value('modes'),
  };
}

function find(map: MapNode, key: string): Node | undefined {
  return map.entries.find((entry) => entry.key.text === key)?.value;
}
