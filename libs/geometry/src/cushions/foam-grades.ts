import { z } from 'zod';
import type { Foam } from '../room/document.ts';
import { KG_M3_PER_LB_FT3, NEWTON_PER_LBF } from '../units/foam-units.ts';
import { MM_PER_INCH } from '../units/length-style.ts';
import type { SettingSource } from './cushion-settings.ts';

const length = (min: number, max: number) => z.number().min(min).max(max);

/** One layer of a laminated foam, from the top down. */
const foamLayerSchema = z.strictObject({
  name: z.string().trim().min(1).max(60),
  thicknessMm: length(3, 250),
  densityKgM3: length(10, 200),
  /** 25 % indentation force deflection in newtons. */
  ifd25N: length(20, 600),
});

/** A foam as a workshop buys it. Density is how long it lasts, firmness how it feels: neither stands without the other. */
export const foamGradeSchema = z.strictObject({
  name: z.string().trim().min(1).max(60),
  use: z.enum(['seat', 'back', 'either']),
  densityKgM3: length(10, 200),
  /** 25 % indentation force deflection in newtons (ASTM D3574), of the whole where it has layers. */
  ifd25N: length(20, 600),
  /** Force at 65 % over force at 25 %. */
  supportFactor: length(1.2, 4),
  /** As it is usually bought. */
  thicknessMm: length(5, 250),
  layers: z.array(foamLayerSchema).max(4),
  /** Bonded polyester round it, both faces together; 0 for none. */
  wrapMm: length(0, 60),
});

export type FoamGrade = z.infer<typeof foamGradeSchema>;

const preset = (
  name: string,
  use: FoamGrade['use'],
  [poundsPerFt3, ifdLbf, supportFactor, thicknessIn]: readonly [number, number, number, number],
): FoamGrade & { source: SettingSource } => ({
  name,
  use,
  densityKgM3: poundsPerFt3 * KG_M3_PER_LB_FT3,
  ifd25N: ifdLbf * NEWTON_PER_LBF,
  supportFactor,
  thicknessMm: thicknessIn * MM_PER_INCH,
  layers: [],
  wrapMm: 0,
  source: 'from memory',
});

/** Grades to begin with: the middle of what the trade uses for each purpose. */
export const FOAM_PRESETS: readonly (FoamGrade & { source: SettingSource })[] = [
  preset('firm seat', 'seat', [2.6, 50, 2.2, 3.75]),
  preset('seat on plywood', 'seat', [2.65, 48, 2.2, 4]),
  preset('seat on webbing', 'seat', [2.25, 38, 2.2, 4]),
  preset('contract booth', 'seat', [2.65, 60, 2.4, 4]),
  preset('quick-dry outdoors', 'either', [2, 40, 2, 4]),
  preset('kneeler', 'either', [2.8, 65, 2.4, 1.5]),
  preset('soft back', 'back', [1.8, 25, 2, 2]),
];

/** Wraps thinner than this are not counted, millimetres. */
const LEAST_WRAP_MM = 1;

/**
 * A grade as a piece has it: with its layers as shares of the foam, and with its wrap.
 *
 * @param grade - as the workshop buys it
 * @param wrapLostMm - lost of each inch of wrap under a sitter, millimetres
 * @returns foam of a set document
 */
export function foamOfGrade(grade: FoamGrade, wrapLostMm: number): Foam {
  const { name, densityKgM3, ifd25N, supportFactor, layers, wrapMm } = grade;
  const whole = layers.reduce((sum, { thicknessMm }) => sum + thicknessMm, 0);
  const shares = layers.map((layer) => ({ share: layer.thicknessMm / whole, times: layer.ifd25N / ifd25N }));
  const lostMm = (wrapMm * wrapLostMm) / MM_PER_INCH;
  return {
    ...{ grade: name, densityKgM3, ifd25N, supportFactor },
    ...(layers.length > 1 ? { layers: shares } : {}),
    ...(wrapMm >= LEAST_WRAP_MM ? { wrap: { thicknessMm: wrapMm, lostMm } } : {}),
  };
}
