import type { FitSheet } from '@settlewright/anthropometry';
import {
  type ComparedCell,
  type ComparedSitter,
  compareSheets,
  diffDocuments,
  type SetDocument,
} from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { seesMeasures } from '../cast/sees-measures';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { FitCheckService } from '../fit-checks/fit-check.service';
import { CAUTION, checkName } from '../fit-checks/shown-sheet';
import { type VerdictSheet, verdictsOnly } from '../fit-checks/verdicts-only';
import type {
  AskComparisonDto,
  AskedVersionDto,
  ComparedChecksDto,
  ComparedVersionDto,
  ComparisonDto,
  DocumentChangeDto,
  TurnedCheckDto,
} from './dto/comparison.dto';
import { versionState } from './answer-fields';
import { type Version, VersionsService } from './versions.service';

type Found = Version & { sheet: FitSheet; setId: string };

/** What changed between two versions of a set, or two sets of a production, and for whom. */
@Injectable()
export class ComparisonsService {
  constructor(
    private readonly versions: VersionsService,
    private readonly fit: FitCheckService,
  ) {}

  async of(
    member: MemberInfo,
    productionId: string,
    setId: string,
    asked: AskComparisonDto,
  ): Promise<ComparisonDto> {
    refuseSame(asked, setId);
    const find = async (one: AskedVersionDto): Promise<Found> => {
      const place = { productionId, setId: one.setId ?? setId };
      const { revisionLetter: letter, draftNumber } = one;
      const found = await this.versions.withSheet(member, { ...place, letter, draftNumber });
      return { ...found, setId: place.setId };
    };
    const [before, after] = [await find(asked.from), await find(asked.to)];
    const { sitters, pieces, joined, left } = compareSheets(
      this.seen(member, before.sheet),
      this.seen(member, after.sheet),
    );
    return {
      detail: seesMeasures(member) ? 'full' : 'verdicts',
      from: versionOf(before),
      to: versionOf(after),
      changes: changesOf(before.document, after.document),
      sitters: sitters.map(({ sitterId, name, ...checks }) => ({ sitterId, name, ...this.checks(checks) })),
      pieces: this.checks(pieces),
      joined,
      left,
      caution: CAUTION,
    };
  }

  /** What is compared is what the reader would see of either sheet. */
  private seen(member: MemberInfo, sheet: FitSheet): FitSheet {
    if (seesMeasures(member)) return sheet;
    const shown: VerdictSheet = verdictsOnly(sheet, this.fit.ruleBook);
    // A comparison reads ids, verdicts and names, which both kinds of sheet have.
    return shown as FitSheet;
  }

  private checks({
    gains,
    losses,
    kept,
  }: Pick<ComparedSitter, 'gains' | 'losses' | 'kept'>): ComparedChecksDto {
    const turned = (cell: ComparedCell): TurnedCheckDto => ({
      ruleId: cell.ruleId,
      name: checkName(this.fit.ruleBook, cell),
      marks: cell.marks,
      from: cell.from,
      to: cell.to,
      ...marginOf('marginBefore', cell.before),
      ...marginOf('marginAfter', cell.after),
    });
    return { gains: gains.map(turned), losses: losses.map(turned), kept };
  }
}

function marginOf<Key extends 'marginBefore' | 'marginAfter'>(
  key: Key,
  cell: ComparedCell['after'],
): Partial<Record<Key, number>> {
  if (cell?.outcome.kind !== 'verdict') return {};
  return { [key]: cell.outcome.margin } as Record<Key, number>;
}

const versionOf = ({ setId, setName, state, sheet }: Found): ComparedVersionDto => ({
  setId,
  setName,
  ...versionState({ state }),
  counts: sheet.counts,
  confidence: sheet.confidence,
  ruleVersion: sheet.ruleVersion,
});

function changesOf(before: SetDocument, after: SetDocument): DocumentChangeDto[] {
  return diffDocuments(before, before, after).map(({ kind, pieceId, mark, key, label, mine, theirs }) => ({
    kind,
    ...(pieceId === undefined ? {} : { pieceId }),
    ...(mark === undefined ? {} : { mark }),
    ...(key === undefined ? {} : { key }),
    label,
    from: mine,
    to: theirs,
  }));
}

function refuseSame({ from, to }: AskComparisonDto, setId: string): void {
  const name = (one: AskedVersionDto) =>
    `${one.setId ?? setId} ${one.revisionLetter?.toUpperCase() ?? 'draft'}`;
  if (name(from) !== name(to)) return;
  const message = `read ${JSON.stringify(to)}, the version that from names; accepted: another version`;
  throw Problem.invalid([{ path: 'to', code: 'same-version', message }]);
}
