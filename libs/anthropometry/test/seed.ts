import headCounts from '@settlewright/seed-data/populations/ansur2-head-counts.json' with { type: 'json' };
import ansur2 from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import children from '@settlewright/seed-data/populations/children.json' with { type: 'json' };
import civilian2015 from '@settlewright/seed-data/populations/civilian-2015.json' with { type: 'json' };
import nations from '@settlewright/seed-data/populations/nations.json' with { type: 'json' };
import fitRules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import { createBodyModel } from '../src/people/body-model.ts';
import { loadRuleBook } from '../src/checks/rule-book.ts';

export { ansur2, children, civilian2015, fitRules, headCounts, nations };
export const model = createBodyModel(ansur2);
export const ruleBook = loadRuleBook(fitRules);
