/**
 * Drives that the board could give a pump: what drives it already, clocks that it has, free pins, and stages behind
 * them.
 */
import type { Board, Chip, Clock, Rail } from '../model/board';
import { formatQuantity } from '../quantity/write';
import type { DrivePlan, NewEntry } from './design';

/** Frequencies of a new clock where neither the board nor the stock names one (common practice, no source), Hz. */
const usualFrequencies = [50e3, 100e3, 200e3];
const mostParallel = 3;

interface Wave {
  readonly name: string;
  readonly entries: readonly NewEntry[];
  readonly chip?: Chip;
  readonly pin?: string;
  readonly swingRail: string;
  readonly label: string;
}

/** One for each way, the simplest first. `twice`: two drives of opposite phase. */
export function drivePlans(board: Board, rail: Rail, twice: boolean): readonly DrivePlan[] {
  const present = presentDrive(board, rail, twice);
  const waves = wavesOf(board, rail);
  const bare = twice ? waves.flatMap((wave) => pairOf(board, wave) ?? []) : waves.map((wave) => plain(wave));
  const stages = twice ? [] : waves.flatMap((wave) => stagesOn(board, wave));
  return [...(present ? [present] : []), ...bare, ...stages];
}

function presentDrive(board: Board, rail: Rail, twice: boolean): DrivePlan | undefined {
  if (rail.origin?.kind !== 'pump') return undefined;
  const names = rail.origin.pump.drive.map(({ name }) => name);
  const [first] = names;
  if (first === undefined || names.length !== (twice ? 2 : 1)) return undefined;
  const driver = board.drivers.get(first);
  const clock = board.clocks.get(driver?.input?.name ?? first);
  const swingRail = driver?.rail?.name ?? (clock && clockRail(board, clock));
  if (swingRail === undefined) return undefined;
  return { label: `${first}, as now`, names, entries: [], parts: [], pins: 0, swingRail };
}

/** Clocks of the board, and one on a free pin of each chip. */
function wavesOf(board: Board, rail: Rail): readonly Wave[] {
  const own = rail.origin?.kind === 'pump' ? rail.origin.pump.drive[0]?.name : undefined;
  const ownClock = own === undefined ? undefined : (board.drivers.get(own)?.input?.name ?? own);
  const clocks = [...board.clocks.values()].flatMap((clock): Wave[] => {
    const swingRail = clockRail(board, clock);
    if (swingRail === undefined || clock.inverseOf) return [];
    const chip = clock.pin && board.chips.get(clock.pin.chip);
    return [
      {
        name: clock.name,
        entries: [],
        swingRail,
        label: clock.name,
        ...(chip && clock.pin ? { chip, pin: clock.pin.pin } : {}),
      },
    ];
  });
  // A pump that is there keeps its clock: another one is another firmware.
  if (ownClock !== undefined) return clocks.filter(({ name }) => name === ownClock);
  return [...clocks, ...newClocks(board, rail)];
}

function newClocks(board: Board, rail: Rail): readonly Wave[] {
  const known = [...board.clocks.values()].flatMap(({ frequency }) => (frequency ? [frequency.typical] : []));
  const frequencies = board.stock.frequencies ?? (known.length > 0 ? [...new Set(known)] : usualFrequencies);
  return [...board.chips.values()].flatMap((chip) => {
    const [pin] = freePins(board, chip);
    if (pin === undefined || !chip.rail) return [];
    return frequencies.map((hertz): Wave => {
      const name = freeName(board, `${rail.name}-clock`);
      const written = formatQuantity(hertz, 'Hz', 6);
      const text = `{ pin: ${chip.name}.${pin}, frequency: ${written}, duty: 50 % }`;
      return {
        name,
        entries: [{ section: 'clocks', name, text }],
        chip,
        pin,
        swingRail: chip.rail!.name,
        label: `${chip.name}.${pin} at ${written}`,
      };
    });
  });
}

function plain({ name, entries, swingRail, label }: Wave): DrivePlan {
  return { label, names: [name], entries, parts: [], pins: entries.length, swingRail };
}

function pairOf(board: Board, wave: Wave): DrivePlan | undefined {
  const present = [...board.clocks.values()].find(({ inverseOf }) => inverseOf?.name === wave.name);
  if (present)
    return {
      label: `${wave.label} and ${present.name}`,
      names: [wave.name, present.name],
      entries: wave.entries,
      parts: [],
      pins: wave.entries.length,
      swingRail: wave.swingRail,
    };
  if (!wave.chip) return undefined;
  const pin = freePins(board, wave.chip).find((each) => each !== wave.pin);
  if (pin === undefined) return undefined;
  const name = freeName(board, `${wave.name}-inverse`);
  const text = `{ pin: ${wave.chip.name}.${pin}, inverse-of: ${wave.name} }`;
  return {
    label: `${wave.label} and its inverse on ${wave.chip.name}.${pin}`,
    names: [wave.name, name],
    entries: [...wave.entries, { section: 'clocks', name, text }],
    parts: [],
    pins: wave.entries.length + 1,
    swingRail: wave.swingRail,
  };
}

/** Pins in parallel, gates, a pair of transistors, a pair of MOSFETs behind the wave. */
function stagesOn(board: Board, wave: Wave): readonly DrivePlan[] {
  const name = freeName(board, `${wave.name}-stage`);
  const plan = (label: string, body: string, parts: readonly string[], pins: number): DrivePlan => ({
    label,
    names: [name],
    entries: [...wave.entries, { section: 'drivers', name, text: `{ input: ${wave.name}, ${body} }` }],
    parts,
    pins: pins + wave.entries.length,
    swingRail: wave.swingRail,
  });
  const { chip, pin } = wave;
  const more = chip && pin !== undefined ? freePins(board, chip).filter((each) => each !== pin) : [];
  const parallel = Array.from({ length: mostParallel - 1 }, (_, k) => k + 2)
    .filter((count) => chip && more.length >= count - 1)
    .map((count) => {
      const pins = [pin!, ...more.slice(0, count - 1)].map((each) => `${chip!.name}.${each}`);
      return plan(`${count} pins of ${chip!.name} in parallel`, `pins: [${pins.join(', ')}]`, [], count - 1);
    });
  const rail = `rail: ${wave.swingRail}`;
  const gate = board.stock.gates?.[0]?.key ?? 'ac';
  const pair = pairKeys(board);
  return [
    ...parallel,
    plan(`a ${gate} gate`, `${rail}, gates: { part: ${gate} }`, [`gate ${gate}`], 0),
    ...(pair.mosfets
      ? [
          plan(
            'a pair of MOSFETs',
            `${rail}, mosfet-pair: { nmos: ${pair.mosfets[0]}, pmos: ${pair.mosfets[1]} }`,
            pair.mosfets,
            0,
          ),
        ]
      : []),
    ...(pair.transistors
      ? ['1 kohm', '4.7 kohm', '15 kohm'].map((base) =>
          plan(
            `a push-pull stage, ${base} at each base`,
            `${rail}, push-pull: { npn: ${pair.transistors![0]}, pnp: ${pair.transistors![1]}, base: { npn: ${base}, pnp: ${base} } }`,
            [...pair.transistors!, `resistor ${base}`, `resistor ${base}`],
            0,
          ),
        )
      : []),
  ];
}

function pairKeys({ stock }: Board) {
  const transistor = (polarity: 'npn' | 'pnp') =>
    stock.transistors
      ? stock.transistors.find((each) => each.polarity === polarity)?.key
      : `${polarity}-small-signal`;
  const mosfet = (channel: 'n' | 'p') =>
    stock.mosfets
      ? stock.mosfets.find((each) => each.channel === channel)?.key
      : `${channel}mos-small-signal`;
  const both = (a: string | undefined, b: string | undefined) => (a && b ? ([a, b] as const) : undefined);
  return {
    transistors: both(transistor('npn'), transistor('pnp')),
    mosfets: both(mosfet('n'), mosfet('p')),
  };
}

function clockRail(board: Board, clock: Clock): string | undefined {
  if (clock.pin) return board.chips.get(clock.pin.chip)?.rail?.name;
  return clock.rail?.name;
}

/** Pins of the chip that nothing in the file uses and that may source current, in the maker's order. */
export function freePins(board: Board, chip: Chip): readonly string[] {
  const data = chip.part?.data;
  const used = new Set(chip.pins.keys());
  for (const { pin } of board.clocks.values()) if (pin?.chip === chip.name) used.add(pin.pin);
  for (const { stage } of board.drivers.values())
    if (stage?.kind === 'pins')
      for (const { chip: on, pin } of stage.pins) if (on === chip.name) used.add(pin);
  const weak = new Set(
    (data?.groups ?? []).filter(({ source }) => source && source.max === 0).flatMap(({ pins }) => pins),
  );
  return (data?.names ?? []).filter((name) => !used.has(name) && !weak.has(name));
}

function freeName(board: Board, wanted: string): string {
  const taken = (name: string) => board.clocks.has(name) || board.drivers.has(name);
  for (let k = 1; ; k++) {
    const name = k === 1 ? wanted : `${wanted}-${k}`;
    if (!taken(name)) return name;
  }
}
