/** Random numbers that are the same at every run: a 32-bit generator after Marsaglia’s xorshift, with a Weyl step. */
export class SeededRandom {
  private state: number;

  constructor(seed: number) {
    this.state = seed >>> 0;
  }

  /** Between 0 and 1, both excluded. */
  uniform(): number {
    this.state = (this.state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(this.state ^ (this.state >>> 15), this.state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return (((mixed ^ (mixed >>> 14)) >>> 0) + 0.5) / 4294967296;
  }

  /** Standard normal, by Box and Muller’s method. */
  normal(): number {
    return Math.sqrt(-2 * Math.log(this.uniform())) * Math.cos(2 * Math.PI * this.uniform());
  }

  /** Chi-squared with a whole number of degrees of freedom. */
  chiSquared(df: number): number {
    let product = 0;
    for (let pair = 0; pair < Math.floor(df / 2); pair++) product -= 2 * Math.log(this.uniform());
    return df % 2 === 1 ? product + this.normal() ** 2 : product;
  }
}
