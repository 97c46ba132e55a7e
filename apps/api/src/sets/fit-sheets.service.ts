import type { FitSheet } from '@settlewright/anthropometry';
import type { SetDocument } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { type CastPerson, castPerson } from '../cast/known-person';
import { seesMeasures } from '../cast/sees-measures';
import type { MemberInfo } from '../common/access.decorator';
import { FitCheckService } from '../fit-checks/fit-check.service';
import type { RoundedBody } from '../fit-checks/rounded-body';
import { type VerdictSheet, verdictsOnly } from '../fit-checks/verdicts-only';
import { ProductionsService } from '../productions/productions.service';
import { DraftsService } from './drafts.service';
import type { SetDraft } from './entities/set-draft.entity';
import type { SetRevision } from './entities/set-revision.entity';
import { SeatedPeople } from './seated-people.service';

/** A sheet as far as its reader may see it. */
export type SeenSheet =
  ({ detail: 'full' } & FitSheet) | ({ detail: 'verdicts'; bodies: RoundedBody[] } & VerdictSheet);

@Injectable()
export class FitSheetsService {
  constructor(
    private readonly drafts: DraftsService,
    private readonly seated: SeatedPeople,
    private readonly fit: FitCheckService,
    private readonly productions: ProductionsService,
  ) {}

  /** The sheet of the draft in force, with the cast as it is known now. */
  async ofDraft(
    member: MemberInfo,
    productionId: string,
    setId: string,
  ): Promise<{ draft: SetDraft; sheet: FitSheet; shown: SeenSheet }> {
    const draft = await this.drafts.get(member, productionId, setId);
    const people = await this.people(productionId, draft.document);
    const { confidence } = await this.productions.workshopOf(productionId);
    const sheet = this.fit.sheetFor(draft.document, people, confidence);
    return { draft, sheet, shown: this.shown(member, sheet, draft.document, people) };
  }

  /** The sheet of a revision as it was stored, as far as the caller may see it. */
  async ofRevision(member: MemberInfo, productionId: string, revision: SetRevision): Promise<SeenSheet> {
    return this.shown(
      member,
      revision.fitSheet,
      revision.document,
      await this.people(productionId, revision.document),
    );
  }

  private shown(member: MemberInfo, sheet: FitSheet, document: SetDocument, people: CastPerson[]): SeenSheet {
    if (seesMeasures(member)) return { detail: 'full', ...sheet };
    return {
      detail: 'verdicts',
      ...verdictsOnly(sheet, this.fit.ruleBook),
      bodies: this.fit.bodiesFor(document, people),
    };
  }

  private async people(productionId: string, document: SetDocument): Promise<CastPerson[]> {
    return (await this.seated.of(productionId, [document])).map(castPerson);
  }
}
