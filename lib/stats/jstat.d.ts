/** The part of jstat that the engine uses; the package ships no types. */
declare module 'jstat' {
  const jstat: {
    jStat: {
      normal: {
        cdf(x: number, mean: number, standardDeviation: number): number;
        inv(p: number, mean: number, standardDeviation: number): number;
      };
      sum(values: readonly number[]): number;
      sumsqrd(values: readonly number[]): number;
    };
  };
  export default jstat;
}
