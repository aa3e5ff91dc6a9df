/**
 * Where the volts go: from the ideal voltage of a pump down to its output, one step for each loss, all on one
 * scale from zero, with the needed window behind and the spread over tolerance on the output. Negative rails are
 * drawn by magnitude and labelled with their sign.
 */
import { swingNeedOf } from '../../analysis/swing-need';
import type { PumpResult, RailResult } from '../../analysis/types';
import { type Band, exactly } from '../../quantity/figure';
import { formatBand } from '../../quantity/write';
import type { Picture, Theme } from '../card';
import { type Inks, inks } from './inks';
import { type Step, stepsOf } from './steps';
import { type Attributes, element, label, svgDocument } from './svg';

const width = 440;
const labelWidth = 128;
const valueWidth = 72;
const chartWidth = width - labelWidth - valueWidth;
const rowHeight = 20;
const barHeight = 11;
const top = 20;

export function voltsPicture(result: RailResult, pump: PumpResult, theme: Theme): Picture {
  const ink = inks[theme];
  const steps = stepsOf(pump);
  const needed = neededOf(result);
  const edges = needed && [Math.abs(needed.min), Math.abs(needed.max)].sort((a, b) => a - b);
  const spread = spreadOf(pump);
  const most = Math.max(...steps.map((step) => step.to), spread[1], edges?.[1] ?? 0) * 1.02;
  const x = (volts: number) => labelWidth + (Math.max(0, volts) / most) * chartWidth;
  const bottom = top + steps.length * rowHeight;
  const height = bottom + 20;

  const parts = [
    hatch(ink),
    edges && needed ? windowOf(edges, formatBand(needed, 'V'), x, bottom, ink) : '',
    element('line', {
      x1: x(0),
      y1: top - 4,
      x2: x(0),
      y2: bottom + 2,
      stroke: ink.faint,
      'stroke-width': 1,
    }),
    ...steps.map((step, row) => stepOf(step, top + row * rowHeight, x, ink)),
    ...steps.slice(0, -1).map((step, row) => linkOf(step, top + row * rowHeight, x, ink)),
    spread[1] - spread[0] > 0.002 * most ? whisker(spread, top + (steps.length - 1) * rowHeight, x, ink) : '',
    spread[1] - spread[0] > 0.002 * most
      ? label(
          labelWidth,
          bottom + 14,
          `├─┤ ${formatBand(signed(pump, spread), 'V')} over tolerance and temperature`,
          { fill: ink.faint, 'font-size': 11 },
        )
      : '',
  ];
  return {
    svg: svgDocument(width, height, `${result.rail.name}: where the volts go`, parts.join('')),
    alternative: inWords(result, steps),
    width,
    height,
  };
}

/** The window, or else what a signal needs at every moment. */
function neededOf(result: RailResult): Band | undefined {
  const limit = swingNeedOf(result)?.limit;
  return result.rail.needs?.voltage ?? (limit === undefined ? undefined : exactly(limit));
}

function spreadOf(pump: PumpResult): readonly [number, number] {
  const [a, b] = [Math.abs(pump.voltage.lowest.value), Math.abs(pump.voltage.highest.value)];
  return a < b ? [a, b] : [b, a];
}

function signed(pump: PumpResult, [low, high]: readonly [number, number]) {
  const [min, max] = pump.heaviest.ideal < 0 ? [-high, -low] : [low, high];
  return { min, typical: (min + max) / 2, max };
}

/** Slanted lines for what is lost. */
function hatch(ink: Inks): string {
  const line = element('path', {
    d: 'M-1,1 l2,-2 M0,6 l6,-6 M5,7 l2,-2',
    stroke: ink.loss,
    'stroke-width': 1.4,
  });
  const pattern = element('pattern', { id: 'h', width: 6, height: 6, patternUnits: 'userSpaceOnUse' }, line);
  return element('defs', {}, pattern);
}

function windowOf(
  edges: readonly number[],
  words: string,
  x: (volts: number) => number,
  bottom: number,
  ink: Inks,
): string {
  const left = x(edges[0] ?? 0);
  const right = x(edges[1] ?? 0);
  const edge = (at: number) =>
    element('line', {
      x1: at,
      y1: top - 4,
      x2: at,
      y2: bottom,
      stroke: ink.need,
      'stroke-width': 1.2,
      'stroke-dasharray': '3 2',
    });
  const fill = element('rect', {
    x: left,
    y: top - 4,
    width: Math.max(0, right - left),
    height: bottom - top + 4,
    fill: ink.need,
    'fill-opacity': ink.needOpacity,
  });
  // The words stand over the window and stay inside the picture.
  const text = label(Math.min(width - 4, Math.max(right, labelWidth + 90)), top - 8, `needs ${words}`, {
    fill: ink.need,
    'text-anchor': 'end',
    'font-size': 11,
  });
  return fill + edge(left) + (right > left ? edge(right) : '') + text;
}

function stepOf(step: Step, y: number, x: (volts: number) => number, ink: Inks): string {
  const strong: Attributes = step.kind === 'loss' ? {} : { 'font-weight': 600 };
  const name = label(0, y + 10, step.name, { fill: ink.text, ...strong });
  const value = label(width, y + 10, step.value, { fill: ink.text, 'text-anchor': 'end', ...strong });
  const left = x(step.from);
  const bar = {
    x: left,
    y,
    // A loss too small for its pixels still shows as a mark.
    width: Math.max(1.5, x(step.to) - left),
    height: barHeight,
  };
  const fills = {
    ideal: { fill: 'none', stroke: ink.output, 'stroke-width': 1.2 },
    loss: { fill: 'url(#h)', stroke: ink.loss, 'stroke-width': 1 },
    output: { fill: ink.output },
  };
  return name + element('rect', { ...bar, ...fills[step.kind] }) + value;
}

/** A thin line from the end of one step down to the next. */
function linkOf(step: Step, y: number, x: (volts: number) => number, ink: Inks): string {
  const at = x(step.kind === 'ideal' ? step.to : step.from);
  return element('line', {
    x1: at,
    y1: y + barHeight,
    x2: at,
    y2: y + rowHeight,
    stroke: ink.faint,
    'stroke-width': 0.8,
  });
}

function whisker(
  spread: readonly [number, number],
  y: number,
  x: (volts: number) => number,
  ink: Inks,
): string {
  const [left, right] = [x(spread[0]), x(spread[1])];
  // Beneath the bar: no line shows on every fill.
  const middle = y + barHeight + 5;
  const d = `M${left.toFixed(1)},${middle - 3.5} v7 M${right.toFixed(1)},${middle - 3.5} v7 M${left.toFixed(1)},${middle} H${right.toFixed(1)}`;
  return element('path', { d, stroke: ink.text, 'stroke-width': 1.6, fill: 'none' });
}

function inWords(result: RailResult, steps: readonly Step[]): string {
  const needed = neededOf(result);
  const words = steps.map((step) => `${step.name} ${step.value}`).join(', ');
  return `${result.rail.name}: ${words}${needed ? `; needs ${formatBand(needed, 'V')}` : ''}`;
}
