import { Injectable } from '@nestjs/common';
import type { MemberInfo } from '../common/access.decorator';
import { FitCheckService } from '../fit-checks/fit-check.service';
import { fitSheetCsv } from '../fit-checks/fit-sheet-csv';
import type { FitSheetPaper } from '../fit-checks/paper/fit-sheet-paper';
import { fitSheetPdf } from '../fit-checks/paper/fit-sheet-pdf';
import { type ConfidenceSince, confidenceSentence, ROUGH } from '../fit-checks/shown-sheet';
import { ProductionsService } from '../productions/productions.service';
import type { Workshop } from '../workshops/entities/workshop.entity';
import { WorkshopsService } from '../workshops/workshops.service';
import { FitSheetsService, type SeenSheet } from './fit-sheets.service';
import { RevisionsService } from './revisions.service';
import { SetAccess } from './set-access';

/** Which sheet of which set is wanted: the one of a revision, or of the draft when no letter is named. */
export interface SheetPlace {
  productionId: string;
  setId: string;
  letter?: string;
}

type Source = Pick<FitSheetPaper, 'state' | 'at' | 'by' | 'confidence'> & { shown: SeenSheet };

/** Fit sheets to keep or print, with as much in them as the caller may see. */
@Injectable()
export class FitSheetFilesService {
  constructor(
    private readonly access: SetAccess,
    private readonly productions: ProductionsService,
    private readonly workshops: WorkshopsService,
    private readonly revisions: RevisionsService,
    private readonly fitSheets: FitSheetsService,
    private readonly fit: FitCheckService,
  ) {}

  async csv(member: MemberInfo, place: SheetPlace): Promise<{ name: string; content: string }> {
    const set = await this.access.forReading(member, place.productionId, place.setId);
    const workshop = await this.workshops.get(member.workshopId);
    const { shown, state, confidence } = await this.source(member, place, workshop);
    return { name: fileName(set.name, state), content: fitSheetCsv(shown, this.fit.ruleBook, confidence) };
  }

  async pdf(member: MemberInfo, place: SheetPlace): Promise<{ name: string; content: Buffer }> {
    const set = await this.access.forReading(member, place.productionId, place.setId);
    const production = await this.productions.forReading(member, place.productionId);
    const workshop = await this.workshops.get(member.workshopId);
    const { shown, ...source } = await this.source(member, place, workshop);
    const content = fitSheetPdf({
      sheet: shown,
      ruleBook: this.fit.ruleBook,
      style: { system: production.units, roundTo: production.roundTo },
      paper: workshop.paper,
      timeZone: workshop.timeZone,
      workshop,
      productionName: production.name,
      setName: set.name,
      ...source,
    });
    return { name: fileName(set.name, source.state), content };
  }

  private async source(
    member: MemberInfo,
    { productionId, setId, letter }: SheetPlace,
    { confidenceSetAt, timeZone }: Workshop,
  ): Promise<Source> {
    const sentence = (shown: SeenSheet, since: ConfidenceSince | null) => {
      const words = confidenceSentence(shown, this.fit.ruleBook, since, timeZone);
      return shown.detail === 'full' ? words : `${words} ${ROUGH}`;
    };
    if (letter === undefined) {
      const { draft, shown } = await this.fitSheets.ofDraft(member, productionId, setId);
      const since: ConfidenceSince | null = confidenceSetAt && { kind: 'set', at: confidenceSetAt };
      return {
        shown,
        confidence: sentence(shown, since),
        state: { kind: 'draft', number: draft.number },
        at: draft.savedAt,
        by: draft.savedBy?.name ?? '',
      };
    }
    const revision = await this.revisions.find(member, productionId, setId, letter);
    const shown = await this.fitSheets.ofRevision(member, productionId, revision);
    const since: ConfidenceSince = { kind: 'issued', at: revision.issuedAt };
    return {
      shown,
      confidence: sentence(shown, since),
      state: { kind: 'revision', letter: revision.letter },
      at: revision.issuedAt,
      by: revision.issuedBy?.name ?? '',
    };
  }
}

function fileName(setName: string, state: FitSheetPaper['state']): string {
  return `${setName} fit sheet ${state.kind === 'revision' ? state.letter : `draft ${state.number}`}`;
}
