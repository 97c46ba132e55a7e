import type { SetDocument } from '@settlewright/geometry';
import type { DataSource } from 'typeorm';
import { type PreparedStatement, runPrepared } from '../database/prepared-statement';
import type { Counts } from './entities/set-draft.entity';

const DRAFTS_IN_FORCE: PreparedStatement = {
  name: 'drafts-in-force',
  text: `
    SELECT draft.set_id AS "setId", draft.number, draft.document, draft.counts, draft.counted_at AS "countedAt",
      draft.saved_at AS "savedAt", draft.saved_by_id AS "savedById", saver.name AS "savedByName"
    FROM sets
    JOIN set_drafts draft ON draft.set_id = sets.id AND draft.number = sets.draft_number
    JOIN users saver ON saver.id = draft.saved_by_id
    WHERE sets.id = ANY ($1::uuid[])`,
};

/** The draft that a set stands at, with the name of who saved it. */
export interface DraftInForce {
  setId: string;
  number: number;
  document: SetDocument;
  counts: Counts | null;
  countedAt: Date;
  savedAt: Date;
  savedById: string;
  savedByName: string;
}

/** The drafts that sets stand at, in no order. */
export function draftsInForce(dataSource: DataSource, setIds: string[]): Promise<DraftInForce[]> {
  return runPrepared<DraftInForce>(dataSource, DRAFTS_IN_FORCE, [setIds]);
}
