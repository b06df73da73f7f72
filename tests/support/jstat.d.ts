/** The few functions of jstat that tests compare with; the package has no types of its own. */
declare module 'jstat' {
  const jStat: {
    readonly erf: (x: number) => number;
    readonly erfc: (x: number) => number;
    readonly normal: {
      readonly pdf: (x: number, mean: number, deviation: number) => number;
      readonly cdf: (x: number, mean: number, deviation: number) => number;
      readonly inv: (p: number, mean: number, deviation: number) => number;
    };
  };
  export default jStat;
}
