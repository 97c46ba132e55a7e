import type { Dimension } from '@settlewright/geometry';
import { memo, useState, type RefObject } from 'react';
import { Button } from '@/components/button.tsx';
import { CAUTION } from '@/lib/caution.ts';
import { todayWords } from '@/lib/dates.ts';
import { useProduction } from '@/lib/production.ts';
import { UNIT_WORDS } from '@/lib/unit-choice.ts';
import { useChoices } from '../choices-view.ts';
import type { StickPaper } from '../stick-paper.ts';
import { movingWords } from '../words.ts';

interface SaveStickProps {
  drawing: RefObject<SVGSVGElement | null>;
  dimension: Dimension;
  /** Sentences under the drawing. */
  words: readonly string[];
  /** What the server's drawing shows. */
  asked: StickPaper;
}

/** The stick as a file to send on, with all that tells what it is: a picture made here, or the server's PDF. */
export const SaveStick = memo(function SaveStick({ drawing, dimension, words, asked }: SaveStickProps) {
  const { setName, draft, style, paper } = useChoices();
  const { name: production } = useProduction();
  const [busy, setBusy] = useState<'png' | 'pdf'>();
  const [problem, setProblem] = useState<string>();

  const picture = async () => {
    const svg = drawing.current;
    if (!svg) return;
    const { pictureOf, keepPng } = await import('../save-picture.ts');
    const canvas = await pictureOf(svg, {
      title: dimension.label,
      above: [
        movingWords(dimension),
        `${production}, ${setName}. Draft ${draft}. ${todayWords()}. Lengths in ${UNIT_WORDS[style.system]}.`,
      ],
      below: [...words.filter(Boolean), CAUTION],
    });
    await keepPng(canvas, `${setName}, ${dimension.label.toLowerCase()}`);
  };
  const save = async (kind: 'png' | 'pdf') => {
    setBusy(kind);
    setProblem(undefined);
    try {
      if (kind === 'png') await picture();
      else await paper('story-stick.pdf', { ...asked });
    } catch (error) {
      setProblem(error instanceof Error ? error.message : 'The file could not be made.');
    } finally {
      setBusy(undefined);
    }
  };
  return (
    <div className="grid gap-2">
      <div className="flex flex-wrap gap-3">
        <Button
          size="small"
          busy={busy !== undefined}
          busyWords={busy === 'png' ? 'Drawing' : undefined}
          onClick={() => void save('png')}
        >
          Save as picture
        </Button>
        <Button
          size="small"
          busy={busy !== undefined}
          busyWords={busy === 'pdf' ? 'Drawing' : undefined}
          onClick={() => void save('pdf')}
        >
          Save as PDF
        </Button>
      </div>
      <div role="alert">{problem && <p className="max-w-text text-sm text-wont">{problem}</p>}</div>
    </div>
  );
});
