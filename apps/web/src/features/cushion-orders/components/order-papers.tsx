import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { Select } from '@/components/select.tsx';
import type { Paper } from '@/lib/contract.ts';
import { download } from '@/lib/download.ts';
import { sayProblem } from '@/lib/problem.ts';
import {
  choosePersonalUnits,
  UNIT_CHOICES,
  UNIT_WORDS,
  unitChoiceId,
  useUnitChoice,
} from '@/lib/unit-choice.ts';
import { orderAddress, publicAddress, type OrderPath } from '../api.ts';
import type { PublicOrder } from '../order.ts';

/** What a shop's own programs read of an order. */
const LISTS = [
  { file: 'schedule.csv', words: 'Schedule (CSV)' },
  { file: 'panels.dxf', words: 'Outlines and panels (DXF)' },
] as const;

const PAPER_WORDS: Record<Paper, string> = { a4: 'A4', letter: 'Letter' };
const PAPERS = ['a4', 'letter'] as const satisfies readonly Paper[];

/** Files of an order for the workshop, fetched with its session. */
export function ShopPapers({ path }: { path: OrderPath }) {
  const [problem, setProblem] = useState<string | null>(null);
  const get = (file: string, query?: Record<string, string>) => {
    setProblem(null);
    download(`${orderAddress(path)}/${file}`, query).catch((error: unknown) => setProblem(sayProblem(error)));
  };
  return (
    <section aria-label="Files for the shop" className="mb-8 print:hidden">
      <RuleHeading>Files for the shop</RuleHeading>
      <div className="flex flex-wrap gap-2 pt-3">
        {LISTS.map(({ file, words }) => (
          <Button key={file} size="small" onClick={() => get(file)}>
            {words}
          </Button>
        ))}
        {PAPERS.map((paper) => (
          <Button key={paper} size="small" onClick={() => get('spec.pdf', { paper })}>
            Drawing pack on {PAPER_WORDS[paper]}
          </Button>
        ))}
      </div>
      {problem && (
        <Notice tone="wont" className="mt-3">
          {problem}
        </Notice>
      )}
    </section>
  );
}

const AS_SENT = 'as-sent';

/** The same behind a private link, with the drawing pack, of what was last sent; units and paper as they prefer them. */
export function LinkPapers({ token, order }: { token: string; order: PublicOrder }) {
  const units = useUnitChoice(({ personal }) => personal);
  const [paper, setPaper] = useState<Paper>(order.paper);
  const asked = new URLSearchParams({
    ...(paper !== order.paper && { paper }),
    ...(units && { units: units.system, roundTo: String(units.roundTo) }),
  }).toString();
  const at = (file: string) => `/api${publicAddress(token)}/${file}`;
  return (
    <section aria-label="The paper" className="mb-8 print:hidden">
      <RuleHeading>The paper</RuleHeading>
      <div className="grid gap-3 py-3">
        <Select
          label="Units"
          value={unitChoiceId(units) ?? AS_SENT}
          options={[
            { value: AS_SENT, words: `As sent: ${UNIT_WORDS[order.units]}` },
            ...UNIT_CHOICES.map(({ id, words }) => ({ value: id, words })),
          ]}
          onChange={(id) => choosePersonalUnits(UNIT_CHOICES.find((one) => one.id === id)?.style ?? null)}
        />
        <Select
          label="Paper"
          value={paper}
          options={PAPERS.map((value) => ({ value, words: PAPER_WORDS[value] }))}
          onChange={setPaper}
        />
      </div>
      <ul className="grid gap-1">
        <li>
          <a className="link" href={`${at('spec.pdf')}${asked === '' ? '' : `?${asked}`}`} download>
            Drawing pack, PDF
          </a>
        </li>
        {LISTS.map(({ file, words }) => (
          <li key={file}>
            <a className="link" href={at(file)} download>
              {words}
            </a>
          </li>
        ))}
      </ul>
    </section>
  );
}
