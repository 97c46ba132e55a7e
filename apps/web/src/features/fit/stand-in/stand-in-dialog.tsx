import { standIn, type StandInCheck } from '@settlewright/anthropometry';
import { useState } from 'react';
import { Dialog } from '@/components/dialog.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { Select } from '@/components/select.tsx';
import { useFitView, type FitBasis } from '../fit-view.ts';
import { blankStranger, knownStranger, StrangerFields } from './stranger-fields.tsx';
import { partWords, standInWords, type Pair } from './stand-in-words.ts';

const STRANGER = 'stranger';

const GROUPS: readonly { title: string; holds: (check: StandInCheck) => boolean }[] = [
  { title: 'This sit cannot tell', holds: ({ answer }) => answer === 'cannotTell' },
  {
    title: 'Says little, the bodies differ too much',
    holds: ({ answer, saysLittle }) => saysLittle && answer !== 'cannotTell',
  },
  {
    title: 'Tells once the difference is counted',
    holds: ({ answer, saysLittle }) => answer === 'withDifference' && !saysLittle,
  },
  {
    title: 'Can be trusted because there is room',
    holds: ({ because, saysLittle }) => because === 'room' && !saysLittle,
  },
  {
    title: 'Can be trusted as it is',
    holds: ({ because, saysLittle }) => because === 'bodies' && !saysLittle,
  },
];

function Group({ title, checks, pair }: { title: string; checks: readonly StandInCheck[]; pair: Pair }) {
  const { ruleBook, style } = useFitView();
  const { littleSaidMm } = ruleBook.standIn;
  if (checks.length === 0) return null;
  return (
    <section className="mt-5">
      <RuleHeading level={3} aside={<span className="text-sm text-ink-2">{checks.length}</span>}>
        {title}
      </RuleHeading>
      <ul>
        {checks.map((check) => {
          const rule = ruleBook.rule(check.ruleId);
          const parts = check.parts.filter(({ low, high }) => low !== 0 || high !== 0);
          return (
            <li key={check.ruleId} className="border-b border-rule py-2">
              <p>
                <strong className="font-semibold">{rule.columnName}:</strong>{' '}
                {standInWords(check, pair, { unit: rule.unit, style, littleSaidMm })}
              </p>
              {parts.length > 0 && (
                <p className="text-sm text-ink-2">
                  {pair.standIn ?? 'The stand-in'} against {pair.castMember}:{' '}
                  {parts.map((part) => partWords(part, style)).join('; ')}.
                </p>
              )}
            </li>
          );
        })}
      </ul>
    </section>
  );
}

function Trial({ basis }: { basis: FitBasis }) {
  const { ruleBook, sheet } = useFitView();
  const seats = basis.sitters.filter(({ kind, noBody }) => kind === 'cast' && !noBody);
  const [seatAt, setSeatAt] = useState(seats[0]?.placeId ?? '');
  const [who, setWho] = useState(STRANGER);
  const [stranger, setStranger] = useState(blankStranger);
  const seat = seats.find(({ placeId }) => placeId === seatAt) ?? seats[0];
  const others = basis.people.filter(({ id }) => id !== seat?.id);
  const chosen = others.find(({ id }) => id === who);
  const known = chosen?.person ?? knownStranger(stranger);
  const { situation, model, settings } = basis;
  const place = situation.places.find(({ placeId }) => placeId === seat?.placeId);
  const checks =
    seat && known && place
      ? standIn({ place, castMember: seat.person, standIn: known, ruleBook, model, settings })
      : [];
  const pair = { castMember: seat?.name ?? '', standIn: chosen?.name };
  const placeWords = (placeId: string) => {
    const row = sheet.rows.find((one) => one.placeId === placeId);
    return row ? `${row.mark}, place ${row.place}` : '';
  };
  return (
    <>
      <div className="grid gap-x-6 gap-y-5 tablet:grid-cols-2">
        <Select
          label="The seat of"
          value={seat?.placeId ?? ''}
          options={seats.map(({ placeId, name }) => ({
            value: placeId,
            words: name,
            detail: placeWords(placeId),
          }))}
          onChange={setSeatAt}
        />
        <Select
          label="Tried by"
          value={chosen ? who : STRANGER}
          options={[
            ...others.map(({ id, name }) => ({ value: id, words: name })),
            { value: STRANGER, words: 'Somebody else', detail: 'not kept' },
          ]}
          onChange={setWho}
        />
        {!chosen && <StrangerFields value={stranger} onChange={setStranger} />}
      </div>
      <div aria-live="polite">
        {!known && <p className="mt-5 text-ink-2">Type a height to see what the sit is worth.</p>}
        {checks.length > 0 &&
          GROUPS.map(({ title, holds }) => (
            <Group key={title} title={title} pair={pair} checks={checks.filter(holds)} />
          ))}
      </div>
    </>
  );
}

/** How far somebody's trial of a seat can be trusted for the person who will sit there. */
export function StandInDialog({ open, onClose }: { open: boolean; onClose: () => void }) {
  const { basis } = useFitView();
  if (!basis) return null;
  return (
    <Dialog
      wide
      losesTyping
      open={open}
      onClose={onClose}
      title="Try a seat with a stand-in"
      describe="A sit tests the seat as built. What it says of somebody else hangs on how the two bodies differ, each in their own shoes and clothes and on the cushion as they press it."
    >
      <Trial basis={basis} />
    </Dialog>
  );
}
