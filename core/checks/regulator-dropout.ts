/**
 * A linear regulator whose input is too low to hold its output.
 */
import type { RegulatorResult } from '../analysis/types';
import { volts } from '../analysis/words';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';

export const regulatorDropout: Check = {
  code: 'regulator-dropout',
  title: 'Regulator without enough input',
  severity: 'error',
  why: 'Below its dropout a regulator no longer regulates: its output follows the input and everything on the rail sees the ripple of the supply.',
  run: (analysis) => [...analysis.regulators.values()].flatMap(dropout),
};

function dropout({ rail, regulator, input }: RegulatorResult): Finding[] {
  const { output, dropout: least, from, kind } = regulator;
  if (!output || !least || kind === 'switching') return [];
  const short = output.typical + least.typical - input.typical;
  const atCorner = output.min + least.max - input.min;
  if (short <= 0 && atCorner <= 0) return [];
  const corner = short <= 0;
  const has = formatQuantity(corner ? input.min : input.typical, 'V');
  const needs = formatQuantity(corner ? output.min + least.max : output.typical + least.typical, 'V');
  return [
    {
      code: 'regulator-dropout',
      severity: corner ? 'warning' : 'error',
      at: `${rail.path}.regulator.dropout`,
      span: least.span ?? rail.nameSpan,
      message: `${rail.name}: ${from?.name ?? 'its input'} ${corner ? 'falls to' : 'is at'} ${has}${corner ? ' at its lowest' : ''}, ${volts(corner ? atCorner : short)} less than the ${needs} that the regulator needs. A regulator with less dropout, a lower output or a higher input cures it.`,
      expected: `at least ${needs}`,
      actual: has,
      source: 'output plus dropout',
    },
  ];
}
