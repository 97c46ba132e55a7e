/**
 * The standard normal quantile of a 32-bit fraction, for drawing many people.
 *
 * @param fraction - whole number from 0 to 2^32 - 1; the middle of its cell is taken, so 0 and 1 are never met
 * @returns standard deviations from the mean; relative error below 1e-6
 * @source M. J. Wichura, Algorithm AS 241 (PPND7), Applied Statistics 37 (1988)
 */
export function quickQuantile(fraction: number): number {
  const p = (fraction + 0.5) / 4294967296;
  const q = p - 0.5;
  if (q >= -0.425 && q <= 0.425) {
    const r = 0.180625 - q * q;
    return (
      (q * (((59.10937472 * r + 159.29113202) * r + 50.434271938) * r + 3.3871327179)) /
      (((67.1875636 * r + 78.757757664) * r + 17.895169469) * r + 1)
    );
  }
  const r = Math.sqrt(-Math.log(q < 0 ? p : 1 - p)) - 1.6;
  const z =
    (((0.17023821103 * r + 1.3067284816) * r + 2.75681539) * r + 1.4234372777) /
    ((0.12021132975 * r + 0.7370016425) * r + 1);
  return q < 0 ? -z : z;
}
