/** The package carries no types of its own. */
declare module 'base45' {
  const base45: { encode(data: Uint8Array | string): string; decode(text: string): Buffer };
  export default base45;
}
