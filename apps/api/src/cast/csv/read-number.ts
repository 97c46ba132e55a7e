import { parseLength, parseMass } from '@settlewright/geometry';
import type { ColumnUnit } from './columns';

export type NumberRead = { ok: true; value: number } | { ok: false; accepted: string; why: string };

export interface NumberSetting {
  /** What a bare number is in. */
  bare: ColumnUnit;
  /** The file keeps commas for decimals, as it separates cells by something else. */
  decimalComma: boolean;
}

const isBareNumber = (text: string) => /^[\d.,]+$/.test(text);

/** A length as people write one: 1842, 184,2 cm, 6' 0 1/2", 72.5 in. Answers in millimetres. */
export function readLength(text: string, { bare, decimalComma }: NumberSetting): NumberRead {
  const pointed = withPoint(text, decimalComma);
  const said = isBareNumber(pointed) ? `${pointed} ${bare}` : pointed;
  const read = parseLength(said, bare === 'in' || bare === 'ft' ? 'in' : 'mm');
  if (read.ok) return { ok: true, value: thousandths(read.value) };
  const { code, accepted, readings } = read.error;
  if (code !== 'ambiguous') return { ok: false, accepted, why: 'this is not a length' };
  const both = readings?.map((mm) => `${thousandths(mm)} mm`).join(' or ');
  return { ok: false, accepted: both ?? accepted, why: 'this can be read in more than one way' };
}

/** A mass such as 61, 61,5 kg or 134 lb. Answers in kilograms. */
export function readMass(text: string, { bare, decimalComma }: NumberSetting): NumberRead {
  const read = parseMass(withPoint(text, decimalComma), bare === 'lb' ? 'lb' : 'kg');
  if (read.ok) return { ok: true, value: thousandths(read.value) };
  return { ok: false, accepted: read.error.accepted, why: 'this is not a mass' };
}

/** Keeps what a tape can tell and drops the noise of the conversion. */
const thousandths = (value: number) => Math.round(value * 1000) / 1000;

function withPoint(text: string, decimalComma: boolean): string {
  return decimalComma ? text.trim().replace(/(\d),(\d)/g, '$1.$2') : text.trim();
}
