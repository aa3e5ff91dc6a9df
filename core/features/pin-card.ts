/**
 * The card of a chip's pin: what it carries in its worst mode against its limits, and what its resistance rests on.
 */
import type { PinResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import type { Figure } from '../quantity/figure';
import { formatBand, formatPercent, formatQuantity } from '../quantity/write';
import type { Span } from '../text/span';
import type { Card } from './card';

export function pinCard(pin: PinResult, span: Span): Card {
  const part = pin.chip.part?.data;
  const setting = pin.chip.pins.get(pin.name)?.strength?.name;
  const charges = pin.charges.length > 0 ? `, charges the gates of ${pin.charges.join(' and ')}` : '';
  const drives = `${pin.drives.length > 0 ? `, drives ${pin.drives.join(' and ')}` : ''}${charges}`;
  return {
    span,
    title: `${pin.key} · ${part?.title ?? 'pin'}${setting ? `, ${setting} setting` : ''}${drives}`,
    ...verdict(pin),
    head: ['', 'out of the pin', 'into the pin'],
    rows: rowsOf(pin),
    origins: originsOf(pin),
  };
}

function verdict(pin: PinResult): Pick<Card, 'answer' | 'state'> {
  const { rms, limit, limitKind, use } = pin;
  if (rms === null) return { answer: 'Its current is not computed.', state: 'neutral' };
  const carried = `${formatQuantity(rms, 'A')} rms`;
  if (limit === null || use === null)
    return { answer: `${carried}; the data sheet’s limit is not known here.`, state: 'neutral' };
  const words = limitKind === 'absolute' ? 'its absolute maximum' : 'the current its levels hold for';
  const state = use > 1 ? 'bad' : use > 0.8 ? 'close' : 'good';
  return {
    answer: `${carried}, ${formatPercent(use, 2)} of ${words} (${formatQuantity(limit.typical, 'A')}).`,
    state,
  };
}

function rowsOf(pin: PinResult): readonly (readonly string[])[] {
  const amps = (value: number | null) => (value === null ? '' : formatQuantity(value, 'A'));
  const ohms = (value: Figure | null) => (value === null ? '' : formatBand(value, 'ohm', 2));
  return [
    ['average', amps(pin.sourceAverage), amps(pin.sinkAverage)],
    ['peak', amps(pin.peakSource), amps(pin.peakSink)],
    ['resistance', ohms(pin.highResistance), ohms(pin.lowResistance)],
  ].filter(([, first, second]) => first !== '' || second !== '');
}

function originsOf({ data, highResistance, lowResistance }: PinResult): readonly string[] {
  const lines: string[] = [];
  const limit = (name: string, figure: Figure | undefined) => {
    if (figure) lines.push(`${name} ${formatQuantity(figure.min, 'A')}: ${originWords(figure.origin)}.`);
  };
  limit('Levels hold up to', data.recommended);
  limit('Absolute maximum', data.absolute);
  if (!data.absolute) lines.push('No absolute maximum is known for this pin.');
  if (highResistance) lines.push(`High resistance: ${originWords(highResistance.origin)}.`);
  if (lowResistance && lowResistance.origin.note !== highResistance?.origin.note)
    lines.push(`Low resistance: ${originWords(lowResistance.origin)}.`);
  return lines;
}
