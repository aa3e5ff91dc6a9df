/**
 * Entries that nothing refers to: leftovers, or a name that was meant somewhere and forgotten. Only information,
 * and modest: a rail with loads is used, and so is a pin with a load of its own.
 */
import type { BoardAnalysis } from '../analysis/types';
import type { PartEntry } from '../catalog/part';
import type { Board, Entry, Rail } from '../model/board';
import type { Check } from './check';
import type { Finding } from './finding';

export const unused: Check = {
  code: 'unused',
  title: 'Entry that nothing uses',
  severity: 'information',
  why: 'A clock or rail that nothing refers to is often one that should have been named somewhere.',
  run: (analysis) => {
    const { board } = analysis.reading;
    return [
      ...entriesWithout(board.supplies, supplyNames(board), 'no rail comes from it'),
      ...entriesWithout(board.clocks, clockNames(board), 'no pump or driver is driven by it'),
      ...entriesWithout(board.drivers, driverNames(board), 'no pump is driven by it'),
      ...unusedRails(board),
      ...unusedPins(board),
      ...unusedModes(board),
      ...unusedParts(analysis),
    ];
  },
};

function entriesWithout(
  entries: ReadonlyMap<string, Entry>,
  names: ReadonlySet<string>,
  because: string,
): readonly Finding[] {
  return [...entries.values()]
    .filter((entry) => !names.has(entry.name))
    .map((entry) => toFinding(entry, because));
}

function toFinding(entry: Pick<Entry, 'name' | 'nameSpan' | 'path'>, because: string): Finding {
  return {
    code: 'unused',
    severity: 'information',
    at: entry.path,
    span: entry.nameSpan,
    message: `${entry.name} is not used: ${because}. Refer to it or delete it.`,
  };
}

function supplyNames(board: Board): ReadonlySet<string> {
  return new Set(
    [...board.rails.values()].flatMap(({ origin }) =>
      origin?.kind === 'supply' ? [origin.supply.name] : [],
    ),
  );
}

/** Drives name clocks and drivers alike. */
function driveNames(board: Board): readonly string[] {
  return [...board.rails.values()].flatMap(({ origin }) =>
    origin?.kind === 'pump' ? origin.pump.drive.map(({ name }) => name) : [],
  );
}

function driverNames(board: Board): ReadonlySet<string> {
  return new Set(driveNames(board));
}

function clockNames(board: Board): ReadonlySet<string> {
  const inputs = [...board.drivers.values()].map(({ input }) => input?.name ?? '');
  const inverted = [...board.clocks.values()].map(({ inverseOf }) => inverseOf?.name ?? '');
  return new Set([...driveNames(board), ...inputs, ...inverted]);
}

function unusedRails(board: Board): readonly Finding[] {
  const named = new Set<string | undefined>();
  for (const { origin } of board.rails.values()) {
    if (origin?.kind === 'regulator') named.add(origin.regulator.from?.name);
    if (origin?.kind === 'filter') named.add(origin.filter.from?.name);
    if (origin?.kind === 'pump') named.add(origin.pump.input?.name);
  }
  for (const { rail } of [...board.chips.values(), ...board.clocks.values(), ...board.drivers.values()])
    named.add(rail?.name);
  const idle = (rail: Rail) => rail.loads.size === 0 && rail.bleeder === undefined && !named.has(rail.name);
  return [...board.rails.values()]
    .filter(idle)
    .map((rail) => toFinding(rail, 'it has no load and nothing stands on it'));
}

function unusedPins(board: Board): readonly Finding[] {
  const driving = new Set(
    [...board.clocks.values()].flatMap(({ pin }) => (pin ? [`${pin.chip}.${pin.pin}`] : [])),
  );
  for (const { stage } of board.drivers.values())
    if (stage?.kind === 'pins') for (const { chip, pin } of stage.pins) driving.add(`${chip}.${pin}`);
  return [...board.chips.values()].flatMap((chip) =>
    [...chip.pins.values()]
      .filter((pin) => !pin.sources && !pin.sinks && !driving.has(`${chip.name}.${pin.name}`))
      .map((pin) => toFinding(pin, 'it has no load of its own and no clock comes from it')),
  );
}

/** Where any load or draw names a mode, a mode that none of them names still stands for the rest of the time. */
function unusedModes(board: Board): readonly Finding[] {
  const named =
    [...board.rails.values()].some(({ loads }) =>
      [...loads.values()].some(({ modes }) => modes !== undefined),
    ) || [...board.chips.values()].some(({ draws }) => draws.some(({ mode }) => mode !== undefined));
  if (named) return [];
  return [...board.modes.values()].map((mode) =>
    toFinding(mode, 'no load and no `draws` differs by mode, so all modes are the same'),
  );
}

function unusedParts({ reading }: BoardAnalysis): readonly Finding[] {
  const used = new Set(
    reading.references.flatMap(({ to, target }) => (to === 'part' && target ? [target.start] : [])),
  );
  return Object.entries(reading.catalogue).flatMap(([family, list]) =>
    (list as readonly PartEntry[]).flatMap((part) => {
      const nameSpan = reading.ownParts.get(part);
      if (nameSpan === undefined || used.has(nameSpan.start)) return [];
      return [
        toFinding({ name: part.key, nameSpan, path: `parts.${family}.${part.key}` }, 'no entry names it'),
      ];
    }),
  );
}
