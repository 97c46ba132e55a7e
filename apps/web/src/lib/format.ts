import { formatLength, formatMass, type LengthStyle, spokenLength } from '@settlewright/geometry';
import { useMemo } from 'react';
import { useUnitStyle } from './unit-choice.ts';

export interface Format {
  style: LengthStyle;
  /** Heights and depths stay in inches; `feet` for people and lengths of pieces. */
  length: (mm: number, options?: { feet?: boolean }) => string;
  spoken: (mm: number, options?: { feet?: boolean }) => string;
  mass: (kg: number) => string;
  /** What a bare number means. */
  bareUnit: 'in' | 'mm';
  bareMass: 'lb' | 'kg';
}

export function formatIn(style: LengthStyle): Format {
  const metric = style.system === 'millimetres';
  return {
    style,
    length: (mm, options) => formatLength(mm, { ...style, feet: options?.feet }),
    spoken: (mm, options) => spokenLength(mm, { ...style, feet: options?.feet }),
    mass: (kg) => formatMass(kg, style),
    bareUnit: metric ? 'mm' : 'in',
    bareMass: metric ? 'kg' : 'lb',
  };
}

/** Lengths and weights as the open production, or the person, wants them. */
export function useFormat(): Format {
  const style = useUnitStyle();
  return useMemo(() => formatIn(style), [style]);
}
