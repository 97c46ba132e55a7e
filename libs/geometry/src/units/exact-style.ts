import { lengthStep, MM_PER_INCH, type LengthStyle } from './length-style.ts';

/** Two numbers nearer than this are one length, millimetres. */
export const SAME_LENGTH_MM = 0.05;

/** The parts in which a length stands as it is, and how far it must be rounded where none does. */
export interface ExactParts {
  /** One part, millimetres. */
  stepMm: number;
  /** Whole parts of the size of the length, sign left out. */
  steps: number;
  /** False when the length lies between two parts and is only near this one. */
  exact: boolean;
}

/**
 * The coarsest parts that hold a length within 0.05 mm: the style's own step, then finer ones down to
 * 1/64 in, a thousandth of an inch or a tenth of a millimetre.
 *
 * @param mm - the length, finite
 * @param style - the display style
 * @returns the parts; those of the style, marked as not exact, where none holds the length
 */
export function exactParts(mm: number, style: LengthStyle): ExactParts {
  const size = Math.abs(mm);
  const inParts = (stepMm: number): ExactParts => {
    const steps = Math.round(size / stepMm);
    return { stepMm, steps, exact: Math.abs(size - steps * stepMm) <= SAME_LENGTH_MM + 1e-9 };
  };
  const all = [lengthStep(style), ...finerSteps(style.system)].map(inParts);
  return all.find((parts) => parts.exact) ?? inParts(lengthStep(style));
}

function finerSteps(system: LengthStyle['system']): number[] {
  if (system === 'millimetres') return [0.1];
  if (system === 'decimal-inches') return [0.01 * MM_PER_INCH, 0.001 * MM_PER_INCH];
  return [16, 32, 64].map((per) => MM_PER_INCH / per);
}
