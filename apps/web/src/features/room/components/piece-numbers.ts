import { parametersOf, type Parameter, type Piece } from '@settlewright/geometry';
import type { NumberParameter } from '../numbers.ts';

const isNumber = (parameter: Parameter): parameter is Parameter & { value: number } =>
  typeof parameter.value === 'number';

/** Numbers of a piece by key. */
export function numbersOf(piece: Piece): Map<string, NumberParameter> {
  return new Map(
    parametersOf(piece)
      .filter(isNumber)
      .map((parameter) => [parameter.key, parameter]),
  );
}
