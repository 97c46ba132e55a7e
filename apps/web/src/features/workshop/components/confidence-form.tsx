import { confidenceText, confidenceWords, SOURCE_MARK_WORDS } from '@settlewright/anthropometry';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { toast } from 'sonner';
import { Button } from '@/components/button.tsx';
import { PaleBars } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { TextField } from '@/components/text-field.tsx';
import type { Workshop } from '@/lib/contract.ts';
import { dayWords } from '@/lib/dates.ts';
import { applyProblem } from '@/lib/form-problem.ts';
import { useRuleBook } from '@/lib/rule-book.ts';
import { useSaveSettings } from '../api.ts';
import { ACCEPTED, readConfidence } from '../read-confidence.ts';

/** The probability that a verdict asks for: everybody reads it, the owner changes it. */
export function ConfidenceForm({ workshop, canChange }: { workshop: Workshop; canChange: boolean }) {
  const rules = useRuleBook();
  const save = useSaveSettings(workshop.id);
  const [problem, setProblem] = useState<string | null>(null);
  const { confidence, confidenceSetAt } = workshop;
  const form = useForm({ values: { confidence: confidence === null ? '' : confidenceText(confidence) } });

  const submit = form.handleSubmit((values) => {
    setProblem(null);
    const reading = readConfidence(values.confidence);
    if (!reading.ok) {
      form.setError('confidence', { message: reading.message }, { shouldFocus: true });
      return;
    }
    save.mutate(
      { confidence: reading.value },
      {
        onSuccess: () => toast('Saved. Drafts are counted anew; issued revisions stay as they are.'),
        onError: (error) => setProblem(applyProblem(error, form)),
      },
    );
  });

  if (rules.data === undefined) return <PaleBars words="Fetching the rules" />;
  const usual = confidenceText(rules.data.confidence);
  const mark = SOURCE_MARK_WORDS[rules.data.confidenceSource.mark];
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="grid gap-4">
      <p className="text-sm text-ink-2">
        {confidenceWords(
          confidence ?? rules.data.confidence,
          rules.data,
          confidenceSetAt ? `set by the workshop on ${dayWords(confidenceSetAt)}` : undefined,
        )}{' '}
        What is less certain is “not known”.
      </p>
      <p className="text-sm text-ink-2">
        Higher: fewer verdicts, and each is wrong less often; more people have to be measured. Lower: more
        verdicts, and more of them wrong. A measured person is judged the same either way.
      </p>
      {canChange && (
        <>
          {problem && <Notice tone="wont">{problem}</Notice>}
          <TextField
            label="Probability a verdict asks for"
            inputMode="decimal"
            autoComplete="off"
            placeholder={usual}
            className="max-w-60"
            description={`${ACCEPTED}. Left empty: the default, ${usual} (${mark}).`}
            error={form.formState.errors.confidence?.message}
            {...form.register('confidence')}
          />
          <div>
            <Button type="submit" look="main" busy={save.isPending} busyWords="Saving">
              Save the probability
            </Button>
          </div>
        </>
      )}
    </form>
  );
}
