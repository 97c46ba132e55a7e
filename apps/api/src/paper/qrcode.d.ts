/** The part of the package that is used here. */
declare module 'qrcode' {
  interface BitMatrix {
    size: number;
    data: Uint8Array;
  }
  export function create(
    text: string,
    options: { errorCorrectionLevel: 'L' | 'M' | 'Q' | 'H' },
  ): { modules: BitMatrix };
}
