/** The few functions of the reference library that tests hold the quantiles against. */
declare module 'jstat' {
  interface Distribution { inv: (probability: number, ...parameters: number[]) => number, cdf: (x: number, ...parameters: number[]) => number }
  const library: { readonly jStat: { readonly studentt: Distribution, readonly normal: Distribution } }
  export default library
}
