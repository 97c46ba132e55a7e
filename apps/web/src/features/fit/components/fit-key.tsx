import { confidenceWords } from '@settlewright/anthropometry';
import { CAUTION } from '@/lib/caution.ts';
import { dayWords } from '@/lib/dates.ts';
import { useFitView } from '../fit-view.ts';

/** What the signs on the sheet mean; stands on every page that shows it. */
export function FitKey() {
  const { detail } = useFitView();
  return (
    <p className="text-sm text-ink-2">
      <strong className="font-semibold text-ink">+</strong> room left to the fail line,{' '}
      <strong className="font-semibold text-ink">−</strong> short of it.{' '}
      {detail === 'verdicts' &&
        'Bodies are personal, so margins of sitters are rough here: at least so much is left, at most so much is short. '}
      <span className="font-medium text-ink">est.</span> predicted or told, with the range that holds 90 in
      100. Cushions pressed by each sitter, shoes on, backs against the rest.
    </p>
  );
}

/** Stands under every sheet. */
export function FitCaution({ small = false }: { small?: boolean }) {
  return <p className={small ? 'text-xs text-ink-2' : 'text-sm text-ink-2'}>{CAUTION}</p>;
}

/** How sure the verdicts of this sheet are, and since when the workshop asks that. */
export function FitConfidence({ small = false }: { small?: boolean }) {
  const { sheet, ruleBook, confidenceSetAt } = useFitView();
  const since = confidenceSetAt ? `set by the workshop on ${dayWords(confidenceSetAt)}` : undefined;
  return (
    <p className={small ? 'text-xs text-ink-2' : 'text-sm text-ink-2'}>
      {confidenceWords(sheet.confidence, ruleBook, since)}
    </p>
  );
}
