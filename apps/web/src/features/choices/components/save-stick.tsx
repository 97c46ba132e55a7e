import type { Dimension } from '@settlewright/geometry';
import { memo, useState, type RefObject } from 'react';
import { Button } from '@/components/button.tsx';
import { CAUTION } from '@/lib/caution.ts';
import { useProduction } from '@/lib/production.ts';
import { UNIT_WORDS } from '@/lib/unit-choice.ts';
import { useChoices } from '../choices-view.ts';
import { movingWords } from '../words.ts';

interface SaveStickProps {
  drawing: RefObject<SVGSVGElement | null>;
  dimension: Dimension;
  /** Sentences under the drawing. */
  words: readonly string[];
}

const DAY = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric' });

/** The stick as a file to send on, with all that tells what it is. */
export const SaveStick = memo(function SaveStick({ drawing, dimension, words }: SaveStickProps) {
  const { setName, draft, style } = useChoices();
  const { name: production } = useProduction();
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<string>();
  const save = async (kind: 'png' | 'pdf') => {
    const svg = drawing.current;
    if (!svg) return;
    setBusy(true);
    setProblem(undefined);
    try {
      const { pictureOf, keepPng } = await import('../save-picture.ts');
      const canvas = await pictureOf(svg, {
        title: dimension.label,
        above: [
          movingWords(dimension),
          `${production}, ${setName}. Draft ${draft}. ${DAY.format(new Date())}. Lengths in ${UNIT_WORDS[style.system]}.`,
        ],
        below: [...words.filter(Boolean), CAUTION],
      });
      const name = `${setName}, ${dimension.label.toLowerCase()}`;
      if (kind === 'png') await keepPng(canvas, name);
      else await (await import('../save-pdf.ts')).keepPdf(canvas, name);
    } catch (error) {
      setProblem(error instanceof Error ? error.message : 'The picture could not be drawn.');
    } finally {
      setBusy(false);
    }
  };
  return (
    <div className="flex flex-wrap items-center gap-3">
      <Button size="small" busy={busy} onClick={() => void save('png')}>
        Save as picture
      </Button>
      <Button size="small" busy={busy} onClick={() => void save('pdf')}>
        Save as PDF
      </Button>
      {problem && <p className="text-sm text-wont">{problem}</p>}
    </div>
  );
});
