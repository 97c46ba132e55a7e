import { formatLength } from '../units/format-length.ts';
import type { LengthStyle } from '../units/length-style.ts';
import { frameAnglesDeg } from './lens.ts';
import type { LensCamera } from './named-view.ts';

const short = (value: number, places: number): string => String(Number(value.toFixed(places)));

/**
 * A lens in one line, as a camera report has it: "50 mm on 24.9 × 18.7, height 4′ 2″".
 *
 * @param lens - the camera
 * @param style - how the height is written; focal length and film back are millimetres in every style
 * @returns plain text
 */
export function lensWords(
  { focalLengthMm, backMm, heightMm }: Pick<LensCamera, 'focalLengthMm' | 'backMm' | 'heightMm'>,
  style: LengthStyle,
): string {
  const back = `${short(backMm.width, 1)} × ${short(backMm.height, 1)}`;
  return `${short(focalLengthMm, 1)} mm on ${back}, height ${formatLength(heightMm, { ...style, feet: true })}`;
}

/**
 * What a frame takes in, in one line: "frame 1.85 : 1, 24.9° across, 13.6° up".
 *
 * @param lens - focal length, film back and ratio are read
 * @returns plain text
 */
export function frameWords(lens: Pick<LensCamera, 'focalLengthMm' | 'backMm' | 'aspect'>): string {
  const { width, height } = frameAnglesDeg(lens);
  return `frame ${short(lens.aspect, 3)} : 1, ${width.toFixed(1)}° across, ${height.toFixed(1)}° up`;
}
