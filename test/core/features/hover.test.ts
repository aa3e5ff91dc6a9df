import { describe, expect, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { hoverAt } from '../../support/hover-at';

const parts =
  'drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 10 uF, kind: x7r }';

const board = `${bench}
  up:
    pump: { topology: doubler, input: v5, ${parts} }
    needs: { voltage: 8..10 V, ripple: 2 mV }
    loads: { lamp: 2 mA }
`;

/** The board with the pointer just before `text`, at its `nth` place. */
function pointAt(text: string, nth = 1, source = board): string {
  let at = -1;
  for (let k = 0; k < nth; k++) at = source.indexOf(text, at + 1);
  if (at < 0) throw new Error(`the board has no ${text}`);
  return `${source.slice(0, at)}$0${source.slice(at)}`;
}

describe('hover on a rail', () => {
  it('answers with voltage, load and margin', () => {
    const card = hoverAt(pointAt('up:'));
    expect(card?.over).toBe('up');
    expect(card?.title).toBe('up · doubler on v5, driven by tick');
    expect(card?.answer).toMatch(/^9\.\d+ V at 2 mA, 1\.\d V to spare at its worst corner\.$/);
    expect(card?.state).toBe('good');
    expect(card?.card.sizable).toBe('up');
  });

  it('shows the closed forms beside the solution', () => {
    // Dickson, 1976: 1/(f C) = 10 ohm; Seeman and Sanders, 2008 (both from memory: confirm): 84.7 ohm.
    expect(hoverAt(pointAt('up:'))?.body).toContain('slow limit 10 ohm, fast limit 84.7 ohm');
    expect(hoverAt(pointAt('up:'))?.body).toMatch(/By hand: 10 V ideal − 2 diodes of/);
  });

  it('names the corner and the parts with their origin', () => {
    const body = hoverAt(pointAt('up:'))?.body ?? '';
    expect(body).toMatch(/Lowest 9\.\d+ V: mainly lowest schottky-signal saturation current/);
    expect(body).toContain('schottky-signal: Small-signal Schottky diode');
    expect(body).toContain('flying 1 µF x7r -10 % to +10 %');
    expect(body).toMatch(/power in and out agree within [\d.]+ %/);
  });

  it('turns bad and close with the need', () => {
    const bad = hoverAt(pointAt('up:', 1, board.replace('8..10 V', '9.5..10 V')));
    expect(bad?.state).toBe('bad');
    expect(bad?.answer).toMatch(/short of 9\.5 V\.$/);
    const ripple = hoverAt(pointAt('up:', 1, board.replace('2 mV', '1 mV')));
    expect(ripple?.state).toBe('bad');
    expect(ripple?.answer).toContain('1.04 mV of ripple where 1 mV are allowed');
  });

  it('sets the weakest moment against swing and headroom', () => {
    const signal = (needs: string) =>
      hoverAt(pointAt('up:', 1, board.replace('voltage: 8..10 V, ripple: 2 mV', needs)));
    const fine = signal('swing: 7 V, headroom: 1.2 V');
    expect(fine?.state).toBe('good');
    expect(fine?.body).toMatch(/weakest moment \| 9\.\d+ V \| 9\.\d+ V \| {2}\| 8\.2 V \(7 V \+ 1\.2 V\)/);
    const assumed = signal('swing: 8 V');
    expect(assumed?.state).toBe('bad');
    expect(assumed?.answer).toMatch(/at its weakest moment, .* short of the 9\.5 V that its signal needs\.$/);
    expect(assumed?.body).toContain('9.5 V (8 V + 1.5 V assumed)');
  });

  it('works on a reference to the rail as on its name', () => {
    const card = hoverAt(pointAt('v5, drive'));
    expect(card?.over).toBe('v5');
    expect(card?.title).toBe('v5 · from supply lab');
  });

  it('says why a rail is not computed', () => {
    const card = hoverAt(pointAt('up:', 1, board.replace('topology: doubler', 'topology: ladder')));
    expect(card?.answer).toMatch(/^Not computed: /);
    expect(card?.state).toBe('neutral');
  });
});

describe('hover on a pin', () => {
  it('shows its current against its limit, on the clock that uses it', () => {
    // Charge balance: average 2 mA each way, rms twice that for half duty.
    const card = hoverAt(pointAt('mcu.P1'));
    expect(card?.over).toBe('mcu.P1');
    expect(card?.answer).toBe('4.01 mA rms, 20 % of the current its levels hold for (20 mA).');
    expect(card?.body).toContain('average | 2 mA | 2 mA');
    expect(card?.body).toContain('resistance | 20 ohm | 20 ohm');
    expect(card?.title).toContain('drives up');
  });

  it('works where the chip lists it', () => {
    const listed = board.replace('draws: 1 mA }', 'draws: 1 mA, pins: { P9: { sources: 25 mA } } }');
    const card = hoverAt(pointAt('P9', 1, listed));
    expect(card?.state).toBe('bad');
    expect(card?.over).toBe('P9');
  });
});

describe('hover on the rest', () => {
  it('shows a clock, also where a pump names it', () => {
    for (const marked of [pointAt('tick:'), pointAt('tick,')]) {
      const card = hoverAt(marked);
      expect(card?.over).toBe('tick');
      expect(card?.answer).toBe('100 kHz, 50 % high, from 0 V to 5 V.');
      expect(card?.body).toContain('lifts | up');
    }
  });

  it('shows a supply and a chip', () => {
    expect(hoverAt(pointAt('lab:'))?.title).toBe('lab · supply');
    expect(hoverAt(pointAt('mcu:'))?.answer).toMatch(/on average/);
  });

  it('shows a catalogue entry with the origin of each figure', () => {
    const card = hoverAt(pointAt('schottky-signal'));
    expect(card?.title).toContain('Small-signal Schottky diode');
    expect(card?.body).toContain('saturation | 9..22..44 nA | 1');
    expect(card?.body).toContain('1: data sheet;');
    expect(hoverAt(pointAt('x7r'))?.body).toContain('tolerance | -10 % to 10 % | 1');
  });

  it("shows a part of the file's own, at its use and at its place", () => {
    for (const marked of [pointAt('plain:'), pointAt('plain,')])
      expect(hoverAt(marked)?.body).toContain('high-resistance | 20 ohm');
  });

  it('shows what a quantity was read as, and where its band comes from', () => {
    const flying = hoverAt(pointAt('1 uF'));
    expect(flying?.over).toBe('1 uF');
    expect(flying?.answer).toBe('1 µF.');
    expect(flying?.body).toContain('The corners take -10 % to +10 % of kind x7r.');
    const need = hoverAt(pointAt('8..10 V'));
    expect(need?.body).toContain('8..10 V | 8 V | 10 V');
    expect(hoverAt(pointAt('50 %'))?.answer).toBe('50 %.');
  });

  it('explains keys and the words behind them', () => {
    expect(hoverAt(pointAt('topology'))?.body).toContain('one of | doubler, inverter');
    expect(hoverAt(pointAt('doubler'))?.answer).toMatch(/^One positive stage/);
    expect(hoverAt(pointAt('reservoir:'))?.answer).toMatch(/^Works/);
  });

  const cell = `supplies:
  cell: { battery: lithium-coin, capacity: 220 mAh, life: 6000 h }
rails:
  vb: { supply: cell, loads: { radio: { current: 10 mA, in: [send] }, clock: { current: 5 uA, in: [wait] } } }
modes: { send: { share: 1 % }, wait: { share: 99 % } }
`;

  it('shows how long a battery lasts, what ends it, where the figures come from, and a caution', () => {
    const card = hoverAt(pointAt('cell:', 1, cell));
    expect(card?.state).toBe('bad');
    expect(card?.answer).toMatch(/; lasts 7[0-4]\.\d days\.$/);
    expect(card?.body).toMatch(/until \| it falls to 2 V under the load of mode send/);
    expect(card?.body).toContain('needed | 250 days');
    expect(card?.body).toContain('capacity | 220 mAh of the file, 85 % of it counted on');
    // 220 mAh / 100 / 8760 h, worked by hand: 0.2511 uA.
    expect(card?.body).toContain('self-discharge | as 251 nA');
    expect(card?.body).toMatch(/^Self-discharge: from memory: confirm; about 1 % a year\.$/m);
    expect(card?.body).toMatch(
      /^Caution: A lithium coin cell must never be charged.*safety rules of your place/m,
    );
    expect(hoverAt(pointAt('cell:', 1, cell.replace('6000 h', '20 d')))?.state).not.toBe('bad');
    expect(hoverAt(pointAt('6000 h', 1, cell))?.answer).toBe('250 days.');
  });

  it('warns of the short circuit of a lithium-ion cell', () => {
    const card = hoverAt(pointAt('cell:', 1, cell.replace('lithium-coin', 'li-ion')));
    expect(card?.body).toMatch(/^Caution: .*tens of amperes.*licensed/m);
    expect(hoverAt(pointAt('lab:'))?.body).not.toContain('Caution');
  });

  it('shows the discharge of a kind of battery with its origin', () => {
    const body = hoverAt(pointAt('lithium-coin', 1, cell))?.body ?? '';
    expect(body).toMatch(/^capacity \| 200\.\.220\.\.235 mAh \|/m);
    expect(body).toMatch(/^usable \| 70 % to 90 %, typically 85 % \| common practice/m);
    expect(body).toMatch(
      /^open-voltage at 100, 90 \.\. 0 % left \| 3\.3 V, .*, 2 V \| from memory: confirm/m,
    );
    expect(body).toMatch(/^aged-resistance at 100, 50, 20, 0 % left \| 10 ohm, .*, 40 ohm \|/m);
    expect(body).toMatch(/^Caution: /m);
  });

  it('says nothing on names that the user gave and on blank places', () => {
    expect(hoverAt(pointAt('lamp'))).toBeUndefined();
    expect(hoverAt(`$0${board}`)).toBeUndefined();
    expect(hoverAt('$0')).toBeUndefined();
  });
});
