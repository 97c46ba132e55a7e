import { type CushionSpec, formatLength, type LengthStyle, marksWords } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import type { MemberInfo } from '../../common/access.decorator';
import { Problem } from '../../common/problem';
import { ProductionsService } from '../../productions/productions.service';
import { requireMark } from '../cushion-mark';
import { OrderFile } from '../files/order-file.entity';
import type { OrderPlace } from '../order-access';
import { OrderActs, type OrderAct, ownedBy } from '../order-acts.service';
import { toleranceOf } from '../order-content';
import { STATE_WORDS } from '../order-states';
import { SentCushions } from '../sent-cushions.service';
import type { InspectDto } from './inspection.dto';
import {
  type InspectedCushion,
  type InspectionKind,
  type MeasuredSize,
  OrderInspection,
} from './order-inspection.entity';
import { judgeCushion, judgeSizes, VERDICT_WORDS } from './size-verdict';

const THING: Record<InspectionKind, string> = { 'first-article': 'first article', received: 'delivery' };
const SIZE_WORDS: Record<MeasuredSize, string> = {
  widthMm: 'width',
  depthMm: 'depth',
  thicknessMm: 'thickness',
};

/** The sheet that the workshop fills in for the first article and for the batch. */
@Injectable()
export class InspectionsService {
  constructor(
    private readonly acts: OrderActs,
    private readonly cushions: SentCushions,
    private readonly productions: ProductionsService,
  ) {}

  inspect(member: MemberInfo, place: OrderPlace, dto: InspectDto): Promise<void> {
    return this.acts.byMember(member, place, async (act) => {
      const { manager, order } = act;
      requireAtHand(act, dto.kind);
      const ordered = await this.cushions.of(order);
      const rows = rowsOf(ordered, dto);
      const toleranceMm = toleranceOf(order.sent);
      requireReason(dto, doubtfulMarks(ordered, rows, dto.kind, toleranceMm));
      await requirePhotos(act, dto.photoIds ?? []);
      const { kind, outcome } = dto;
      const note = dto.note ?? '';
      const sheet = await manager.save(
        manager.create(OrderInspection, {
          ...ownedBy(act),
          ...{ kind, outcome, note, toleranceMm, cushions: rows },
          revisionLetter: order.sent.revisionLetter,
          photoIds: dto.photoIds ?? [],
        }),
      );
      if (order.state === 'shipped') {
        order.state = 'received';
        await manager.save(order);
        await act.happened('state', { fromState: 'shipped' });
      }
      await act.happened(`${kind === 'received' ? 'delivery' : kind}-${outcome}`, { note });
      const { units: system } = await this.productions.forReading(member, place.productionId);
      await act.tell({
        about: `the ${THING[kind]} is ${outcome}`,
        words: [
          `We inspected the ${THING[kind]} and have ${outcome} it.`,
          note,
          sheetWords(sheet, { system, roundTo: 16 }),
        ],
      });
    });
  }
}

function rowsOf(ordered: readonly CushionSpec[], dto: InspectDto): InspectedCushion[] {
  return dto.cushions.map((row, index) => {
    requireMark(ordered, row.mark, `cushions.${index}.mark`);
    const finished = ordered.find(({ mark }) => mark === row.mark)?.finishedMm;
    if (!finished) throw Problem.notFound('cushion');
    const { widthMm, depthMm, thicknessMm } = finished;
    const measured = {
      widthMm: row.widthMm ?? null,
      depthMm: row.depthMm ?? null,
      thicknessMm: row.thicknessMm ?? null,
    };
    return { mark: row.mark, asked: { widthMm, depthMm, thicknessMm }, measured, note: row.note ?? '' };
  });
}

/** Cushions that are out or were not measured; of a delivery also those that are not on the sheet. */
function doubtfulMarks(
  ordered: readonly CushionSpec[],
  rows: readonly InspectedCushion[],
  kind: InspectionKind,
  toleranceMm: number,
): string[] {
  const within = new Set(
    rows.filter((row) => judgeCushion(judgeSizes(row, toleranceMm)) === 'within').map(({ mark }) => mark),
  );
  const asked = kind === 'received' ? ordered : rows;
  return asked.map(({ mark }) => mark).filter((mark) => !within.has(mark));
}

function requireAtHand({ order }: OrderAct, kind: InspectionKind): void {
  const at = kind === 'first-article' ? ['first-article'] : ['shipped', 'received'];
  if (at.includes(order.state)) return;
  throw Problem.conflict(
    'nothing-to-inspect',
    `An order that is ${STATE_WORDS[order.state]} has no ${THING[kind]} to inspect.`,
  );
}

/** Unknown is never a pass: accepting what is out or was not measured asks for a word on it. */
function requireReason(dto: InspectDto, doubtful: readonly string[]): void {
  if ((dto.note ?? '') !== '') return;
  if (dto.outcome === 'accepted' && doubtful.length === 0) return;
  const message =
    dto.outcome === 'rejected'
      ? 'say why it is rejected'
      : `${marksWords(doubtful)} ${doubtful.length === 1 ? 'is out or was' : 'are out or were'} not measured: say why it is accepted`;
  throw Problem.invalid([{ path: 'note', code: 'reason-missing', message }]);
}

async function requirePhotos({ manager, order }: OrderAct, ids: readonly string[]): Promise<void> {
  if (ids.length === 0) return;
  const found = await manager.countBy(OrderFile, { id: In([...ids]), orderId: order.id, state: 'kept' });
  if (found !== ids.length) {
    throw Problem.invalid([
      { path: 'photoIds', code: 'unknown-file', message: 'names a file that the order does not have' },
    ]);
  }
}

function sheetWords({ cushions, toleranceMm }: OrderInspection, style: LengthStyle): string {
  return cushions
    .map((row) => {
      const sizes = judgeSizes(row, toleranceMm).map(({ size, askedMm, measuredMm, verdict }) => {
        const got = measuredMm === null ? '' : `, measured ${formatLength(measuredMm, style)}`;
        return `${SIZE_WORDS[size]} ${formatLength(askedMm, style)}${got}: ${VERDICT_WORDS[verdict]}`;
      });
      return [`${row.mark}: ${sizes.join('; ')}`, row.note].filter(Boolean).join('. ');
    })
    .join('\n');
}
