import type { LengthStyle } from './length-style.ts';
import { fail, ok, type Result } from './result.ts';

/** Kilograms in one avoirdupois pound, exactly. */
export const KG_PER_POUND = 0.45359237;

/** Pounds in one stone, the unit people are weighed in in Britain. */
const POUNDS_PER_STONE = 14;

/** Heaviest mass that is read, in kilograms. */
export const HEAVIEST_MASS_KG = 100_000;

/** Why a typed mass was not taken. */
export interface MassError {
  code: 'empty' | 'unreadable' | 'negative' | 'too-large';
  read: string;
  accepted: string;
  message: string;
}

const ACCEPTED = 'a weight such as 170 lb, 12 st 2 lb, 77 kg or 77.5';
const NUMBER = '\\d+(?:[.,]\\d*)?|[.,]\\d+';
const POUND = 'lbs?|pounds?';
const MASS = new RegExp(`^(${NUMBER}) ?(?:(kgs?|kilograms?|kilos?)|(${POUND}))?\\.?$`);
const STONES = new RegExp(`^(${NUMBER}) ?(?:stones?|sts?)\\.?(?:[ ,]*(${NUMBER}) ?(?:${POUND})?\\.?)?$`);

/**
 * Reads a mass.
 *
 * @param text - as typed: 170 lb, 12 st 2 lb, 12st 2, 77 kg, 77.5
 * @param bareUnit - unit of a bare number: the display unit
 * @returns kilograms, or an error with what was read and what is accepted
 */
export function parseMass(text: string, bareUnit: 'lb' | 'kg'): Result<number, MassError> {
  const plain = text.trim().toLowerCase().replace(/[−–]/g, '-').replace(/\s+/g, ' ');
  const error = (code: MassError['code'], message: string) =>
    fail<MassError>({ code, read: text, accepted: ACCEPTED, message });
  if (plain === '') return error('empty', `Nothing was typed. Type ${ACCEPTED}.`);
  if (plain.startsWith('-')) return error('negative', `“${text.trim()}” is below zero. Type ${ACCEPTED}.`);
  const stones = STONES.exec(plain);
  const parts = MASS.exec(plain);
  if (stones === null && parts === null) {
    return error('unreadable', `“${text.trim()}” is not a weight. Type ${ACCEPTED}.`);
  }
  if (stones !== null && !isStonesAndPounds(stones)) {
    return error(
      'unreadable',
      `“${text.trim()}” is not a weight: whole stones come before pounds, and fewer than 14 pounds behind them. Type ${ACCEPTED}.`,
    );
  }
  const kg = stones === null ? kilograms(parts?.[1], parts?.[2], parts?.[3], bareUnit) : ofStones(stones);
  if (kg > HEAVIEST_MASS_KG) {
    return error('too-large', `“${text.trim()}” is more than 100,000 kg, the heaviest weight read.`);
  }
  return ok(kg);
}

const numberOf = (text: string | undefined): number => Number((text ?? '0').replace(',', '.'));

function isStonesAndPounds([, stones, pounds]: RegExpExecArray): boolean {
  return pounds === undefined || (numberOf(pounds) < POUNDS_PER_STONE && Number.isInteger(numberOf(stones)));
}

const ofStones = ([, stones, pounds]: RegExpExecArray): number =>
  (numberOf(stones) * POUNDS_PER_STONE + numberOf(pounds)) * KG_PER_POUND;

function kilograms(
  number: string | undefined,
  metric: string | undefined,
  pound: string | undefined,
  bareUnit: 'lb' | 'kg',
): number {
  const inPounds = pound !== undefined || (metric === undefined && bareUnit === 'lb');
  return numberOf(number) * (inPounds ? KG_PER_POUND : 1);
}

/**
 * Writes a mass for show: whole pounds with inches, kilograms with millimetres (one decimal below ten).
 *
 * @param kg - the mass, finite
 * @param style - the display style of lengths; mass follows its system
 * @returns text such as "170 lb" or "77 kg" with a space that does not break
 */
export function formatMass(kg: number, style: LengthStyle): string {
  const metric = style.system === 'millimetres';
  const value = metric ? kg : kg / KG_PER_POUND;
  const decimals = Math.abs(value) < 10 ? 1 : 0;
  const shown = Number(Math.abs(value).toFixed(decimals));
  return `${kg < 0 && shown > 0 ? '−' : ''}${shown}\u202f${metric ? 'kg' : 'lb'}`;
}
