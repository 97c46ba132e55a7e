import { fail, ok, type Result } from './result.ts';

/** Why a typed angle was not taken. */
export interface AngleError {
  code: 'empty' | 'unreadable' | 'out-of-range';
  read: string;
  accepted: string;
  message: string;
}

const ACCEPTED = 'degrees between −360 and 360, such as 8, 8° or 7.5 deg';
const ANGLE = /^([+-]?)(\d+(?:[.,]\d*)?|[.,]\d+) ?(?:°|deg|degs|degree|degrees)?$/;

/**
 * Reads an angle in degrees.
 *
 * @param text - as typed: 8, 8°, 7.5 deg, −2
 * @returns degrees, or an error with what was read and what is accepted
 */
export function parseAngle(text: string): Result<number, AngleError> {
  const plain = text.trim().toLowerCase().replace(/[−–]/g, '-').replace(/\s+/g, ' ');
  const error = (code: AngleError['code'], message: string) =>
    fail<AngleError>({ code, read: text, accepted: ACCEPTED, message });
  if (plain === '') return error('empty', `Nothing was typed. Type ${ACCEPTED}.`);
  const parts = ANGLE.exec(plain);
  if (parts === null) return error('unreadable', `“${text.trim()}” is not an angle. Type ${ACCEPTED}.`);
  const size = Number((parts[2] ?? '').replace(',', '.'));
  if (size > 360)
    return error('out-of-range', `“${text.trim()}” is more than a full turn. Type ${ACCEPTED}.`);
  return ok(parts[1] === '-' && size > 0 ? -size : size);
}

/**
 * Writes an angle for show, to a tenth of a degree: "8°", "7.5°", "−2°".
 *
 * @param degrees - the angle, finite
 * @returns text with a true minus sign
 */
export function formatAngle(degrees: number): string {
  const tenths = Math.round(Math.abs(degrees) * 10) / 10;
  return `${degrees < 0 && tenths > 0 ? '−' : ''}${tenths}°`;
}

/**
 * Degrees as radians; the library computes in radians.
 *
 * @param degrees - finite
 * @returns radians
 */
export function radians(degrees: number): number {
  return (degrees * Math.PI) / 180;
}

/**
 * Radians as degrees, for the edges.
 *
 * @param angleRad - finite
 * @returns degrees
 */
export function degrees(angleRad: number): number {
  return (angleRad * 180) / Math.PI;
}
