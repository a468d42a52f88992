const LARGE = 1e100;
const SMALL = 1e-100;

/** The logarithm of a long product of positive numbers, with a logarithm taken only when the product grows out of bounds. */
export class LogProduct {
  private sum = 0;
  private product = 1;

  times(factor: number): void {
    this.product *= factor;
    if (this.product > LARGE || this.product < SMALL) {
      this.sum += Math.log(this.product);
      this.product = 1;
    }
  }

  log(): number {
    return this.sum + Math.log(this.product);
  }
}
