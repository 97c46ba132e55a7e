import {
  MEASURE_INFO,
  TAPE_MEASURE_KEYS,
  type MeasureKey,
  type NextMeasureKey,
} from '@settlewright/anthropometry';
import { Link } from 'react-router-dom';
import { useFitView } from '../fit-view.ts';

const ENTERED: readonly MeasureKey[] = ['stature', 'weight_kg', ...TAPE_MEASURE_KEYS];

const isEntered = (key: MeasureKey): key is NextMeasureKey => ENTERED.includes(key);

/** A measure by the name of its field, as a way to that field where there is one. */
export function MeasureLink({ castId, of, measure }: { castId?: string; of: string; measure: MeasureKey }) {
  const { personTo, basis } = useFitView();
  const { plain } = MEASURE_INFO[measure];
  const isCast = castId !== undefined && (basis?.people.some(({ id }) => id === castId) ?? false);
  if (!personTo || !isCast || !isEntered(measure)) return plain;
  return (
    <Link className="link" to={personTo(castId, measure)}>
      {plain}
      <span className="sr-only">, enter it for {of}</span>
    </Link>
  );
}
