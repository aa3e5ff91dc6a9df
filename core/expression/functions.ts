/**
 * The functions an expression may call: arithmetic only, each with its rule for dimensions.
 */
import { type Measure, none, power, pure, same } from './dimension';

/** A sentence instead of a result says why there is none. */
export type FunctionResult = Measure | string;

export const functions: ReadonlyMap<string, (operands: readonly Measure[]) => FunctionResult> = new Map([
  ['min', (operands: readonly Measure[]) => pick(operands, Math.min)],
  ['max', (operands: readonly Measure[]) => pick(operands, Math.max)],
  ['abs', one((a) => ({ value: Math.abs(a.value), dimension: a.dimension }))],
  ['sqrt', one((a) => ({ value: Math.sqrt(a.value), dimension: power(a.dimension, 0.5) }))],
  ['exp', one(numberOnly('exp', Math.exp))],
  ['log', one(numberOnly('log', Math.log))],
  ['log10', one(numberOnly('log10', Math.log10))],
  ['round', one(numberOnly('round', Math.round))],
  ['floor', one(numberOnly('floor', Math.floor))],
  ['ceil', one(numberOnly('ceil', Math.ceil))],
]);

function pick(operands: readonly Measure[], choose: (...values: number[]) => number): FunctionResult {
  const [first] = operands;
  if (!first) return 'it needs at least one figure.';
  if (!operands.every(({ dimension }) => same(dimension, first.dimension))) {
    return 'its figures must be of one kind.';
  }
  return { value: choose(...operands.map(({ value }) => value)), dimension: first.dimension };
}

function one(
  compute: (operand: Measure) => FunctionResult,
): (operands: readonly Measure[]) => FunctionResult {
  return (operands) => {
    const [operand] = operands;
    return operand && operands.length === 1 ? compute(operand) : 'it needs exactly one figure.';
  };
}

function numberOnly(name: string, compute: (value: number) => number): (operand: Measure) => FunctionResult {
  return (operand) =>
    same(operand.dimension, none)
      ? pure(compute(operand.value))
      : `\`${name}\` takes a plain number: divide by a unit first.`;
}
