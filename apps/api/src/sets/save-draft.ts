import type { SetDocument } from '@settlewright/geometry';
import type { DataSource } from 'typeorm';
import type { MemberInfo } from '../common/access.decorator';
import { type PreparedStatement, runPrepared } from '../database/prepared-statement';
import { castIdsOf } from './seated-people.service';

/** Drafts of a set that stay, so that a stale save can be compared with what it began from. */
const KEPT_DRAFTS = 50;

/**
 * The whole of a save. `counted` compares the number and counts it on, which keeps other writers off the set until the
 * draft is in; it finds no row when the path leads nowhere, when something is put away, when the number is stale or
 * when somebody seated does not belong to the production. Ids are compared as text: the document keeps them as text.
 */
const SAVE_DRAFT: PreparedStatement = {
  name: 'save-draft',
  text: `
    WITH counted AS (
      UPDATE sets
      SET draft_number = sets.draft_number + 1, updated_at = now()
      FROM productions production
      WHERE sets.id = $1 AND sets.production_id = $2 AND sets.draft_number = $3 AND sets.archived_at IS NULL
        AND production.id = $2 AND production.workshop_id = $4 AND production.archived_at IS NULL
        AND NOT EXISTS (
          SELECT FROM unnest($5::text[]) AS seated(id)
          WHERE NOT EXISTS (
            SELECT FROM cast_members person
            WHERE person.id = seated.id::uuid AND person.id::text = seated.id AND person.production_id = $2))
      RETURNING sets.draft_number
    ), kept AS (
      -- Counted when somebody looks at the list: far fewer look than save.
      INSERT INTO set_drafts (set_id, number, document, counts, counted_at, saved_by_id)
      SELECT $1, draft_number, $6::jsonb, NULL, 'epoch', $7 FROM counted
      RETURNING number, saved_at, saved_by_id
    ), trimmed AS (
      DELETE FROM set_drafts WHERE set_id = $1 AND number <= (SELECT number FROM kept) - ${KEPT_DRAFTS}
    )
    SELECT kept.number, kept.saved_at AS "savedAt", kept.saved_by_id AS "savedById", saver.name AS "savedByName"
    FROM kept JOIN users saver ON saver.id = kept.saved_by_id`,
};

export interface SavedDraft {
  number: number;
  savedAt: Date;
  savedById: string;
  savedByName: string;
}

/** Stores the next draft of a set; null when it could not be saved, whatever the reason. */
export async function saveDraft(
  dataSource: DataSource,
  member: MemberInfo,
  place: { productionId: string; setId: string; baseNumber: number },
  document: SetDocument,
): Promise<SavedDraft | null> {
  const [saved] = await runPrepared<SavedDraft>(dataSource, SAVE_DRAFT, [
    place.setId,
    place.productionId,
    place.baseNumber,
    member.workshopId,
    castIdsOf(document),
    JSON.stringify(document),
    member.userId,
  ]);
  return saved ?? null;
}
