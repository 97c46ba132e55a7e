import type { SetDocument } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import type { KeptRow } from '../common/kept-text';
import type { MemberInfo } from '../common/access.decorator';
import { textsOf, withTexts } from './document-texts';
import { DraftsService } from './drafts.service';
import { DesignedSet } from './entities/designed-set.entity';
import { RevisionApproval } from './entities/revision-approval.entity';
import { SetDraft } from './entities/set-draft.entity';
import { SetNote } from './entities/set-note.entity';
import { SetRevision } from './entities/set-revision.entity';
import { whileErasing } from './erasing';

/** What people typed into the sets of a production: drafts, issued revisions, notes and words of approval. */
@Injectable()
export class SetTexts {
  constructor(private readonly drafts: DraftsService) {}

  /** Row by row, as the documents of a production together may be large. To be rewritten, nobody saves meanwhile. */
  async *of(
    manager: EntityManager,
    member: MemberInfo,
    productionId: string,
    { toRewrite }: { toRewrite: boolean },
  ): AsyncGenerator<KeptRow> {
    const sets = await manager.find(DesignedSet, {
      where: { productionId },
      order: { name: 'ASC', id: 'ASC' },
      ...(toRewrite ? { lock: { mode: 'pessimistic_write' } } : {}),
    });
    for (const set of sets) {
      yield {
        texts: [{ where: `${set.name}, its name`, text: set.name }],
        rewrite: (change) => manager.update(DesignedSet, { id: set.id }, { name: change(set.name) }),
      };
      yield* this.ofNotes(manager, set);
      yield* this.ofRevisions(manager, set);
      yield* this.ofDrafts(manager, member, set);
    }
  }

  private async *ofNotes(manager: EntityManager, set: DesignedSet): AsyncGenerator<KeptRow> {
    for (const { id, kind, text } of await manager.findBy(SetNote, { setId: set.id })) {
      yield {
        texts: [{ where: `${set.name}, ${kind === 'mark' ? 'mark from the floor' : 'room note'}`, text }],
        rewrite: (change) => manager.update(SetNote, { id }, { text: change(text) }),
      };
    }
  }

  private async *ofRevisions(manager: EntityManager, set: DesignedSet): AsyncGenerator<KeptRow> {
    const select = { id: true, letter: true, ordinal: true } as const;
    const issued = await manager.find(SetRevision, {
      where: { setId: set.id },
      select,
      order: { ordinal: 'ASC' },
    });
    for (const { id, letter } of issued) {
      const { document, note } = await manager.findOneByOrFail(SetRevision, { id });
      const where = `${set.name}, revision ${letter}`;
      yield {
        texts: [{ where: `${where}, its note`, text: note }, ...textsOf(document, where)],
        rewrite: (change) =>
          whileErasing(manager, () =>
            manager.update(
              SetRevision,
              { id },
              { note: change(note), document: withTexts(document, change) },
            ),
          ),
      };
      for (const approval of await manager.findBy(RevisionApproval, { revisionId: id })) {
        yield {
          texts: [{ where: `${where}, word on it`, text: approval.comment }],
          rewrite: (change) =>
            manager.update(RevisionApproval, { id: approval.id }, { comment: change(approval.comment) }),
        };
      }
    }
  }

  private async *ofDrafts(
    manager: EntityManager,
    member: MemberInfo,
    set: DesignedSet,
  ): AsyncGenerator<KeptRow> {
    const kept = await manager.find(SetDraft, { where: { setId: set.id }, order: { number: 'DESC' } });
    for (const { number, document } of kept) {
      const inForce = number === set.draftNumber;
      const where = inForce ? `${set.name}, draft` : `${set.name}, earlier drafts`;
      yield {
        texts: textsOf(document, where),
        rewrite: async (change) => {
          // Whoever has the set open learns of it: the draft goes on to a further number.
          if (inForce) await this.carryOn(manager, member, set, withTexts(document, change));
          await manager.update(
            SetDraft,
            { setId: set.id, number },
            { document: withTexts(document, change) },
          );
        },
      };
    }
  }

  private async carryOn(
    manager: EntityManager,
    member: MemberInfo,
    set: DesignedSet,
    document: SetDocument,
  ): Promise<void> {
    const draftNumber = set.draftNumber + 1;
    await manager.update(DesignedSet, { id: set.id }, { draftNumber });
    await this.drafts.keep(manager, member, { ...set, draftNumber }, document);
  }
}
