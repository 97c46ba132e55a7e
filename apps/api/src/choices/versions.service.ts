import type { FitSheet } from '@settlewright/anthropometry';
import type { SetDocument } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { CastService } from '../cast/cast.service';
import { type CastPerson, castPerson } from '../cast/known-person';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { FitCheckService } from '../fit-checks/fit-check.service';
import { ProductionsService } from '../productions/productions.service';
import { DraftsService } from '../sets/drafts.service';
import { RevisionsService } from '../sets/revisions.service';
import { castIdsOf } from '../sets/seated-people.service';
import { SetAccess } from '../sets/set-access';

/** Which version of which set is meant: a revision, or the draft when no letter is named. */
export interface VersionPlace {
  productionId: string;
  setId: string;
  letter?: string | undefined;
  /** The draft that was seen; another one is refused. */
  draftNumber?: number | undefined;
}

/** One version of a set with everyone it names, as they are known now. */
export interface Version {
  setName: string;
  state: { kind: 'revision'; letter: string } | { kind: 'draft'; number: number };
  at: Date;
  by: string;
  document: SetDocument;
  people: CastPerson[];
  /** What the workshop asks of a verdict, or what an issued sheet was made with; null: as the rule book does. */
  confidence: number | null;
}

/** Finds versions that the caller may see. */
@Injectable()
export class VersionsService {
  constructor(
    private readonly access: SetAccess,
    private readonly drafts: DraftsService,
    private readonly revisions: RevisionsService,
    private readonly cast: CastService,
    private readonly productions: ProductionsService,
    private readonly fit: FitCheckService,
  ) {}

  async find(member: MemberInfo, place: VersionPlace): Promise<Version> {
    return place.letter === undefined
      ? this.draft(member, place)
      : (await this.revision(member, place, place.letter)).version;
  }

  /** With its sheet: the stored one of a revision, and one made now of the draft. */
  async withSheet(member: MemberInfo, place: VersionPlace): Promise<Version & { sheet: FitSheet }> {
    if (place.letter !== undefined) {
      const { version, sheet } = await this.revision(member, place, place.letter);
      return { ...version, sheet };
    }
    const version = await this.draft(member, place);
    return { ...version, sheet: this.fit.sheetFor(version.document, version.people, version.confidence) };
  }

  private async draft(member: MemberInfo, place: VersionPlace): Promise<Version> {
    const { productionId, setId, draftNumber } = place;
    const { name } = await this.access.forReading(member, productionId, setId);
    const draft = await this.drafts.get(member, productionId, setId);
    if (draftNumber !== undefined && draft.number !== draftNumber) {
      const detail = `Draft ${draftNumber} was meant, but the set is at draft ${draft.number}.`;
      throw Problem.conflict('draft-moved-on', detail, { currentNumber: draft.number });
    }
    const { confidence } = await this.productions.workshopOf(productionId);
    return {
      setName: name,
      state: { kind: 'draft', number: draft.number },
      at: draft.savedAt,
      by: draft.savedBy?.name ?? '',
      document: draft.document,
      people: await this.people(productionId, draft.document),
      confidence,
    };
  }

  private async revision(
    member: MemberInfo,
    { productionId, setId }: VersionPlace,
    letter: string,
  ): Promise<{ version: Version; sheet: FitSheet }> {
    const { name } = await this.access.forReading(member, productionId, setId);
    const revision = await this.revisions.find(member, productionId, setId, letter);
    const { document, fitSheet } = revision;
    const version: Version = {
      setName: name,
      state: { kind: 'revision', letter: revision.letter },
      at: revision.issuedAt,
      by: revision.issuedBy?.name ?? '',
      document,
      people: await this.people(productionId, document),
      confidence: fitSheet.confidence,
    };
    return { version, sheet: fitSheet };
  }

  private async people(productionId: string, document: SetDocument): Promise<CastPerson[]> {
    return (await this.cast.among(productionId, [...new Set(castIdsOf(document))])).map(castPerson);
  }
}
