/** The one part of jStat that the house uses; the package brings no types. */
declare module 'jstat' {
  export const jStat: { readonly studentt: { inv(probability: number, degreesOfFreedom: number): number } };
}
