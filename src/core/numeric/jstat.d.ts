declare module 'jstat' {
  interface Distribution {
    inv(p: number, ...parameters: number[]): number;
    cdf(x: number, ...parameters: number[]): number;
  }
  const jStat: {
    readonly normal: Distribution;
    readonly studentt: Distribution;
    readonly centralF: Distribution;
    readonly beta: Distribution;
    readonly chisquare: Distribution;
  };
  export default jStat;
}
