/** A scalar root for the reference integration: slow, sure, and unlike anything in the engine. */

/** Root of a falling function, by bracketing around the last one and false position with a bisection guard. */
export function fallingRoot(f: (x: number) => number, start: number): number {
  let width = 0.01;
  let left = start - width;
  let right = start + width;
  let atLeft = f(left);
  let atRight = f(right);
  while (atLeft < 0) {
    width *= 4;
    right = left;
    atRight = atLeft;
    left -= width;
    atLeft = f(left);
  }
  width = 0.01;
  while (atRight > 0) {
    width *= 4;
    left = right;
    atLeft = atRight;
    right += width;
    atRight = f(right);
  }
  for (let i = 0; i < 200 && right - left > 1e-13 * Math.max(1, Math.abs(left)); i++) {
    const straight = (left * atRight - right * atLeft) / (atRight - atLeft);
    // Every third step halves, so that one slow end cannot hold the bracket open.
    const x = i % 3 === 2 || !(straight > left && straight < right) ? (left + right) / 2 : straight;
    const value = f(x);
    if (value === 0) return x;
    if (value > 0) {
      left = x;
      atLeft = value;
    } else {
      right = x;
      atRight = value;
    }
  }
  return (left + right) / 2;
}
