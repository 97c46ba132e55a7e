import {
  formatAngle,
  formatExactLength,
  lengthStep,
  parseAngle,
  parseLength,
  spokenExactLength,
  type LengthStyle,
  type Parameter,
} from '@settlewright/geometry';
import { typedForm } from '@/components/measure.tsx';

/** What was typed into a number, and what it would mean. */
export type Reading =
  | { kind: 'value'; value: number }
  /** Readable, but impossible here; the nearest possible value is offered. */
  | { kind: 'outside'; value: number; limit: number; which: 'longest' | 'shortest' }
  /** Two readings: both are offered, none is guessed. */
  | { kind: 'ambiguous'; message: string; readings: number[] }
  | { kind: 'unreadable'; message: string };

/** What a number needs to say of itself to be shown and typed. */
export type NumberParameter = Pick<Parameter, 'key' | 'label' | 'kind' | 'unit' | 'min' | 'max'> & {
  value: number;
  describes?: string;
};

/** Lengths along a piece are said in feet and inches, heights and depths in inches. */
const inFeet = (parameter: Pick<NumberParameter, 'key'>): boolean => /length/i.test(parameter.key);

export const styleFor = (parameter: Pick<NumberParameter, 'key'>, style: LengthStyle): LengthStyle => ({
  ...style,
  feet: inFeet(parameter),
});

/** A number that somebody chose, never shown as another one. */
export function showNumber(parameter: NumberParameter, style: LengthStyle, value = parameter.value): string {
  if (parameter.kind === 'length') return formatExactLength(value, styleFor(parameter, style));
  if (parameter.kind === 'angle') return formatAngle(value);
  return parameter.unit === '' ? String(value) : `${Math.round(value)}\u202f${parameter.unit}`;
}

export function sayNumber(parameter: NumberParameter, style: LengthStyle, value = parameter.value): string {
  if (parameter.kind === 'length') return spokenExactLength(value, styleFor(parameter, style));
  return parameter.kind === 'angle' ? `${value} degrees` : showNumber(parameter, style, value);
}

/** The same value in the other system, so that a reader can check it: "457.2 mm". */
export function inOtherUnits(
  parameter: NumberParameter,
  style: LengthStyle,
  value = parameter.value,
): string | undefined {
  if (parameter.kind !== 'length') return undefined;
  const other: LengthStyle =
    style.system === 'millimetres'
      ? { system: 'feet-inches', roundTo: style.roundTo, feet: inFeet(parameter) }
      : { system: 'millimetres', roundTo: style.roundTo };
  return formatExactLength(value, other);
}

export function stepOf(parameter: NumberParameter, style: LengthStyle): number {
  if (parameter.kind === 'length') return lengthStep(style);
  return parameter.kind === 'angle' ? 0.5 : 1;
}

/** Moves a value by whole steps, onto the grid of what can be shown. */
export function stepped(
  parameter: NumberParameter,
  style: LengthStyle,
  value: number,
  steps: number,
): number {
  const size = Math.abs(steps) < 1 ? Math.abs(steps) : 1;
  const step = stepOf(parameter, style) * size;
  const next = (Math.round(value / step) + steps / size) * step;
  return Math.min(Math.max(next, parameter.min), parameter.max);
}

function readPlain(parameter: NumberParameter, text: string, style: LengthStyle): Reading {
  if (parameter.kind === 'length') {
    // A shown value may have been begun from: what is changed of it is meant as typed.
    const read = parseLength(text.replace(/^\s*≈/, ''), style.system === 'millimetres' ? 'mm' : 'in', {
      negative: parameter.min < 0,
    });
    if (read.ok) return { kind: 'value', value: read.value };
    return read.error.readings
      ? { kind: 'ambiguous', message: read.error.message, readings: read.error.readings }
      : { kind: 'unreadable', message: read.error.message };
  }
  if (parameter.kind === 'angle') {
    const read = parseAngle(text);
    return read.ok
      ? { kind: 'value', value: read.value }
      : { kind: 'unreadable', message: read.error.message };
  }
  const number = parameter.unit === '' ? /^(\d+)$/ : /^(\d+(?:[.,]\d+)?)\s*(?:N|kg\/m³)?$/;
  const read = number.exec(text.replace(/\u202f/g, ' ').trim());
  return read
    ? { kind: 'value', value: Number((read[1] ?? '').replace(',', '.')) }
    : {
        kind: 'unreadable',
        message: `“${text.trim()}” is not a number. Type one such as ${parameter.unit === '' ? '2' : '220'}.`,
      };
}

function saysPresent(parameter: NumberParameter, text: string, style: LengthStyle): boolean {
  const shown = showNumber(parameter, style);
  return [shown, typedForm(shown)].some((form) => form.trim() === text.trim());
}

/** Of two readings only those that are possible here are worth a choice. */
function possibleOf(
  parameter: NumberParameter,
  text: string,
  style: LengthStyle,
  reading: Extract<Reading, { kind: 'ambiguous' }>,
): Reading {
  const readings = reading.readings.filter((value) => value >= parameter.min && value <= parameter.max);
  if (readings.length > 0) return { ...reading, readings };
  // Rounded inwards: what is named here can be typed.
  const step = stepOf(parameter, style);
  const least = showNumber(parameter, style, Math.ceil(parameter.min / step - 1e-6) * step);
  const most = showNumber(parameter, style, Math.floor(parameter.max / step + 1e-6) * step);
  return {
    kind: 'unreadable',
    message: `“${text.trim()}” can be read in more than one way, and none is possible here. Type ${least} to ${most}.`,
  };
}

/** Reads what was typed into a number of a piece. */
export function readNumber(parameter: NumberParameter, text: string, style: LengthStyle): Reading {
  const reading = readPlain(parameter, text, style);
  if (reading.kind === 'ambiguous') return possibleOf(parameter, text, style, reading);
  if (reading.kind !== 'value') return reading;
  // Text that shows the present value means that value, with all its millimetres.
  if (saysPresent(parameter, text, style)) return { kind: 'value', value: parameter.value };
  const { value } = reading;
  if (value > parameter.max + 1e-6) return { kind: 'outside', value, limit: parameter.max, which: 'longest' };
  if (value < parameter.min - 1e-6)
    return { kind: 'outside', value, limit: parameter.min, which: 'shortest' };
  return reading;
}
