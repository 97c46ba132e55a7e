import { useState } from 'react';
import { MarkTag } from '@/components/mark-tag.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { dayWords } from '@/lib/dates.ts';
import type { Desk, Question } from './desk.ts';
import { MarkChoice } from './mark-choice.tsx';
import { StepForm } from './step-form.tsx';

interface QuestionsProps {
  desk: Desk;
  questions: readonly Question[];
  marks: readonly string[];
  /** Names the texts kept on this device. */
  keptAs: string;
  /** Nothing more can be asked of an order that is over. */
  open: boolean;
}

function Row({
  desk,
  question,
  keptAs,
  open,
}: Omit<QuestionsProps, 'questions' | 'marks'> & { question: Question }) {
  const { cushionMark, text, byName, at, answer, answeredAt, answeredByName, side } = question;
  const waits = answeredAt === null;
  return (
    <li className="border-b border-rule py-2.5">
      <p className="flex items-center gap-2 text-sm">
        {cushionMark && <MarkTag timber="cushion" mark={cushionMark} />}
        <b className="font-semibold">{side === desk.side ? 'You' : byName}</b>
        <span className={waits ? 'font-medium text-tight' : 'text-ink-2'}>{waits ? 'open' : 'answered'}</span>
        <time dateTime={at} className="ml-auto text-ink-2">
          {dayWords(at)}
        </time>
      </p>
      <p className="break-words whitespace-pre-line">{text}</p>
      {!waits && (
        <p className="mt-1 border-l-2 border-rule-strong pl-3 break-words whitespace-pre-line">
          <b className="text-sm font-semibold">{side === desk.side ? answeredByName : 'You'}:</b> {answer}
        </p>
      )}
      {waits && open && side !== desk.side && (
        <div className="mt-2">
          <StepForm
            desk={desk}
            keptAs={`${keptAs}.answer.${question.id}`}
            label="Answer"
            verb="Answer the question"
            step={`questions/${question.id}/answer`}
            body={(written) => ({ answer: written })}
          />
        </div>
      )}
    </li>
  );
}

/** Questions pinned to a cushion or the order, each open until the other side answers it. */
export function Questions({ desk, questions, marks, keptAs, open }: QuestionsProps) {
  const [mark, setMark] = useState<string | null>(null);
  const waiting = questions.filter(({ answeredAt }) => answeredAt === null).length;
  return (
    <section aria-label="Questions" className="mb-8">
      <RuleHeading aside={waiting > 0 && <span className="text-sm text-tight">{waiting} open</span>}>
        Questions
      </RuleHeading>
      {questions.length > 0 && (
        <ol>
          {questions.map((question) => (
            <Row key={question.id} {...{ desk, question, keptAs, open }} />
          ))}
        </ol>
      )}
      {open && (
        <div className="mt-3">
          <StepForm
            desk={desk}
            keptAs={`${keptAs}.question`}
            label="Question"
            verb="Ask"
            step="questions"
            body={(text) => ({ text, cushionMark: mark })}
          >
            <MarkChoice marks={marks} mark={mark} onChange={setMark} />
          </StepForm>
        </div>
      )}
    </section>
  );
}
