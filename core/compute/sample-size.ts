/** How many random samples bound a share of all boards, whatever the distribution. */

/**
 * Smallest N so that with the given confidence at least `coverage` of all boards lie beyond the sample's extreme:
 * one side `1 - g^N >= b`, two sides `1 - N g^(N-1) + (N-1) g^N >= b`.
 *
 * Both shares between 0 and 1, excluded; undefined otherwise.
 * Source: S. S. Wilks, Annals of Mathematical Statistics 12, 91-96, 1941 (from memory: confirm).
 * Worked: 0.95 and 0.95: 59 for one side, 93 for two.
 */
export function sampleSize(coverage: number, confidence: number, sides: 1 | 2): number | undefined {
  if (!(coverage > 0 && coverage < 1 && confidence > 0 && confidence < 1)) return undefined;
  const reached = (n: number) =>
    sides === 1
      ? 1 - coverage ** n >= confidence
      : 1 - n * coverage ** (n - 1) + (n - 1) * coverage ** n >= confidence;
  let high = 2;
  while (!reached(high)) high *= 2;
  let low = high / 2;
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (reached(middle)) high = middle;
    else low = middle;
  }
  return reached(low) ? low : high;
}

/**
 * The same turned round: the largest share of all boards that, with the given confidence, lies beyond the lowest
 * (one side) or between the lowest and the highest (two sides) of `samples` samples.
 *
 * Source: S. S. Wilks, as above. One side is also the bound on what fails when no sample failed:
 * `1 - g = 1 - (1 - b)^(1/N)`, about 3/N for 95 % (the rule of three; common practice).
 * Worked: 59 samples and 0.95: 0.950 for one side; 93: 0.950 for two.
 */
export function sampledCoverage(samples: number, confidence: number, sides: 1 | 2): number | undefined {
  if (!(samples >= sides && Number.isInteger(samples) && confidence > 0 && confidence < 1)) return undefined;
  if (sides === 1) return (1 - confidence) ** (1 / samples);
  let low = 0;
  let high = 1;
  for (let round = 0; round < 60; round++) {
    const g = (low + high) / 2;
    if (1 - samples * g ** (samples - 1) + (samples - 1) * g ** samples >= confidence) low = g;
    else high = g;
  }
  return low;
}
