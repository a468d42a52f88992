/** Means and variances of a mixture of several quantities, added one component at a time. */
export class Mixture {
  private weight = 0;
  private readonly mean: Float64Array;
  private readonly within: Float64Array;
  private readonly between: Float64Array;

  constructor(quantities: number) {
    this.mean = new Float64Array(quantities);
    this.within = new Float64Array(quantities);
    this.between = new Float64Array(quantities);
  }

  /** Weights need not sum to 1; they are above 0. */
  add(weight: number, means: readonly number[], variances: readonly number[]): void {
    const { mean, within, between } = this;
    this.weight += weight;
    const share = weight / this.weight;
    const rest = 1 - share;
    for (let index = 0; index < mean.length; index += 1) {
      const distance = means[index]! - mean[index]!;
      mean[index]! += share * distance;
      within[index]! += share * (variances[index]! - within[index]!);
      between[index] = rest * (between[index]! + share * distance * distance);
    }
  }

  means(): number[] {
    return Array.from(this.mean);
  }

  /** The mean of the variances plus the variance of the means. */
  variances(): number[] {
    return Array.from(this.within, (value, index) => value + this.between[index]!);
  }
}
