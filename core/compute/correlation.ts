/** How closely two quantities go together, sample by sample. */

/**
 * Linear correlation, -1..1: `sum (x - mx)(y - my) / sqrt(sum (x - mx)^2 sum (y - my)^2)`, gathered one pair at a
 * time about the means so far, so that small spreads on large values keep their digits.
 *
 * Source: K. Pearson, Proceedings of the Royal Society 58, 1895; running sums as B. P. Welford, Technometrics 4, 1962
 * (both from memory: confirm).
 */
export class Correlation {
  #count = 0;
  #meanX = 0;
  #meanY = 0;
  #xx = 0;
  #yy = 0;
  #xy = 0;

  add(x: number, y: number): void {
    this.#count++;
    const dx = x - this.#meanX;
    const dy = y - this.#meanY;
    this.#meanX += dx / this.#count;
    this.#meanY += dy / this.#count;
    this.#xx += dx * (x - this.#meanX);
    this.#yy += dy * (y - this.#meanY);
    this.#xy += dx * (y - this.#meanY);
  }

  /** Undefined for fewer than three pairs, or where one of the two never moves. */
  get value(): number | undefined {
    const scale = Math.sqrt(this.#xx * this.#yy);
    return this.#count < 3 || !(scale > 0) ? undefined : this.#xy / scale;
  }

  /** Two standard errors of the correlation of things that have nothing to do with each other. */
  get noise(): number {
    return 2 / Math.sqrt(this.#count);
  }
}
