/**
 * What a filter leaves of a periodic voltage, harmonic by harmonic.
 */

export interface FilterParts {
  /** In series with the source: resistor and inductor, either may be 0. */
  readonly ohms: number;
  readonly henries: number;
  /** Across the load. */
  readonly farads: number;
  readonly esrOhms: number;
  /** Infinity for none. */
  readonly loadOhms: number;
}

/** Harmonics beyond this are far below the first behind any filter that is worth its name. */
const harmonics = 64;

/**
 * Peak-to-peak voltage behind `R + jwL` across `(ESR + 1/(jwC)) || Rload` (phasors, any textbook on circuits).
 * `time` (s) and `volts` (V) are one period of the source, at points of any spacing joined by straight lines, the
 * first point at the period's start, the last one at its end. Each harmonic's amplitude is the exact integral
 * over the straight lines; that harmonics end rounds sharp peaks by less than 1 %. Undefined for fewer than two points or parts out of range.
 *
 * Example: a triangle of 1 V peak to peak and 100 kHz behind 100 ohm and 1 uF (corner 1.6 kHz) leaves T/(8RC) times
 * 1 V = 12.5 mV, the peak of the integral of a triangle.
 */
export function filteredRipple(
  time: readonly number[],
  volts: readonly number[],
  { ohms, henries, farads, esrOhms, loadOhms }: FilterParts,
): number | undefined {
  const count = time.length;
  const period = (time.at(-1) ?? 0) - (time[0] ?? 0);
  if (count < 2 || !(period > 0) || !(farads > 0) || !(ohms >= 0 && henries >= 0)) return undefined;
  const samples = 512;
  const output = new Float64Array(samples);
  for (let n = 1; n <= harmonics; n++) {
    const w = (2 * Math.PI * n) / period;
    const source = coefficient(time, volts, w, period);
    const shunt = parallel({ re: esrOhms, im: -1 / (w * farads) }, loadOhms);
    const total = { re: shunt.re + ohms, im: shunt.im + w * henries };
    const left = times(source, over(shunt, total));
    for (let k = 0; k < samples; k++) {
      const angle = (2 * Math.PI * n * k) / samples;
      output[k] = output[k]! + 2 * (left.re * Math.cos(angle) - left.im * Math.sin(angle));
    }
  }
  let low = Number.POSITIVE_INFINITY;
  let high = Number.NEGATIVE_INFINITY;
  for (const v of output) {
    low = Math.min(low, v);
    high = Math.max(high, v);
  }
  return high - low;
}

interface Complex {
  readonly re: number;
  readonly im: number;
}

/**
 * `(1/T) * integral of v(t) exp(-jwt)` over one period: each straight line by parts, with the jump between the last
 * and the first point as part of the curve.
 */
function coefficient(time: readonly number[], volts: readonly number[], w: number, period: number): Complex {
  let re = 0;
  let im = 0;
  const start = time[0]!;
  for (let k = 1; k < time.length; k++) {
    const [t0, t1] = [time[k - 1]! - start, time[k]! - start];
    const [v0, v1] = [volts[k - 1]!, volts[k]!];
    const span = t1 - t0;
    if (!(span > 0)) continue;
    const slope = (v1 - v0) / span;
    // Antiderivative of v exp(-jwt): (j v / w + slope / w^2) exp(-jwt).
    const [c0, s0, c1, s1] = [Math.cos(w * t0), Math.sin(w * t0), Math.cos(w * t1), Math.sin(w * t1)];
    const grow = slope / (w * w);
    re += (v1 / w) * s1 + grow * c1 - ((v0 / w) * s0 + grow * c0);
    im += (v1 / w) * c1 - grow * s1 - ((v0 / w) * c0 - grow * s0);
  }
  return { re: re / period, im: im / period };
}

function parallel(a: Complex, ohms: number): Complex {
  if (!Number.isFinite(ohms)) return a;
  return over({ re: a.re * ohms, im: a.im * ohms }, { re: a.re + ohms, im: a.im });
}

function times(a: Complex, b: Complex): Complex {
  return { re: a.re * b.re - a.im * b.im, im: a.re * b.im + a.im * b.re };
}

function over(a: Complex, b: Complex): Complex {
  const size = b.re * b.re + b.im * b.im;
  return { re: (a.re * b.re + a.im * b.im) / size, im: (a.im * b.re - a.re * b.im) / size };
}
