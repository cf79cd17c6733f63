declare module 'jstat' {
  const jstat: { chisquare: { cdf(x: number, df: number): number } };
  export default jstat;
}
