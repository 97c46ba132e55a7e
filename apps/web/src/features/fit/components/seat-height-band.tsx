import { formatLength, seatHeightNeeds, type SetDocument } from '@settlewright/geometry';
import { Measure } from '@/components/measure.tsx';
import { useFitView } from '../fit-view.ts';

const MM_PER_INCH = 25.4;

/** The usual height with its two sources, and beside it what the sitters of this bench need. */
export function SeatHeightBand({ document, pieceId }: { document: SetDocument; pieceId: string }) {
  const { sheet, ruleBook, style } = useFitView();
  const practice = ruleBook.practices.find(({ id }) => id === 'seat-height');
  const clause = ruleBook.rule('ACC-01');
  const { bands, common } = seatHeightNeeds(document, sheet, pieceId);
  const show = (mm: number) => <Measure text={formatLength(mm, style)} />;
  const inches = (value: number) => show(value * MM_PER_INCH);
  return (
    <span className="mt-2 block">
      {practice && (
        <>
          Usual: {inches(practice.lowerIn)} to {inches(practice.upperIn)}, mostly {inches(practice.usualIn)} (
          {practice.sourceWord}).{' '}
        </>
      )}
      An accessible bench: {inches(clause.numbers.lowerIn ?? 0)} to {inches(clause.numbers.upperIn ?? 0)},
      unpressed (clause {clause.clause}, {clause.sourceWord}), high to help a transfer from a wheelchair.{' '}
      {bands.length === 0
        ? 'Nobody sits here yet, so nothing is known of what they need.'
        : common
          ? null
          : 'No height fits everybody here. '}
      {common && (
        <strong className="font-semibold text-ink">
          These sitters need {show(common.lowerMm)} to {show(common.upperMm)} pressed.
        </strong>
      )}
      {!common &&
        bands.map(({ placeId, name, fits }) => (
          <span key={placeId} className="block">
            {name}: {show(fits.lower ?? 0)} to {show(fits.upper ?? 0)}
          </span>
        ))}
    </span>
  );
}
