import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { download } from '@/lib/download.ts';
import { sayProblem } from '@/lib/problem.ts';
import { orderAddress, publicAddress, type OrderPath } from '../api.ts';

/** What a shop's own programs read of an order. */
const LISTS = [
  { file: 'schedule.csv', words: 'Schedule (CSV)' },
  { file: 'panels.dxf', words: 'Outlines and panels (DXF)' },
] as const;

/** Files of an order for the workshop, fetched with its session. */
export function ShopPapers({ path }: { path: OrderPath }) {
  const [problem, setProblem] = useState<string | null>(null);
  const get = (file: string) => {
    setProblem(null);
    download(`${orderAddress(path)}/${file}`).catch((error: unknown) => setProblem(sayProblem(error)));
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
      </div>
      {problem && (
        <Notice tone="wont" className="mt-3">
          {problem}
        </Notice>
      )}
    </section>
  );
}

/** The same behind a private link, with the drawing pack, of what was last sent. */
export function LinkPapers({ token }: { token: string }) {
  const at = (file: string) => `/api${publicAddress(token)}/${file}`;
  return (
    <section aria-label="The paper" className="mb-8 print:hidden">
      <RuleHeading>The paper</RuleHeading>
      <ul className="grid gap-1 pt-2">
        <li>
          <a className="link" href={at('spec.pdf')} download>
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
