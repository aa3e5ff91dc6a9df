/**
 * Expressions in place of quantities.
 */
export { evaluateExpression, isExpression, longestExpression } from './evaluate';
