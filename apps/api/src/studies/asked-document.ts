import type { SetDocument } from '@settlewright/geometry';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import type { DraftsService } from '../sets/drafts.service';
import type { RevisionsService } from '../sets/revisions.service';
import type { AskedDocumentDto } from './dto/asked-document.dto';

/** The draft that the caller has seen, if it is still in force, or an issued revision. */
export async function askedDocument(
  { drafts, revisions }: { drafts: DraftsService; revisions: RevisionsService },
  member: MemberInfo,
  productionId: string,
  setId: string,
  { draftNumber, revisionLetter }: AskedDocumentDto,
): Promise<SetDocument> {
  const given = [draftNumber, revisionLetter].filter((one) => one !== undefined && one !== null);
  if (given.length !== 1) {
    const read = given.length === 0 ? 'neither' : 'both';
    const message = `read ${read}; accepted: the number of the draft or the letter of a revision`;
    throw Problem.invalid([{ path: 'draftNumber', code: 'one-document', message }]);
  }
  if (typeof revisionLetter === 'string') {
    return (await revisions.find(member, productionId, setId, revisionLetter)).document;
  }
  const draft = await drafts.get(member, productionId, setId);
  if (draft.number !== draftNumber) {
    const detail = `Draft ${draftNumber} was asked about, but the set is at draft ${draft.number}.`;
    throw Problem.conflict('draft-moved-on', detail, { currentNumber: draft.number });
  }
  return draft.document;
}
