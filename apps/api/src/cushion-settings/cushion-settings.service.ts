import {
  cushionRules,
  type CushionRules,
  NO_OWN_CUSHIONS,
  type WorkshopCushions,
  workshopCushionsSchema,
} from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { WorkshopsService } from '../workshops/workshops.service';
import { CushionSettingsRow } from './cushion-settings.entity';

export interface KeptCushionSettings {
  number: number;
  settings: WorkshopCushions;
  changedAt: Date | null;
  changedByName: string | null;
}

@Injectable()
export class CushionSettingsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly workshops: WorkshopsService,
    private readonly audit: AuditService,
  ) {}

  async read(
    workshopId: string,
    manager: EntityManager = this.dataSource.manager,
  ): Promise<KeptCushionSettings> {
    const row = await manager.findOne(CushionSettingsRow, {
      where: { workshopId },
      relations: { changedBy: true },
    });
    if (!row) return { number: 0, settings: NO_OWN_CUSHIONS, changedAt: null, changedByName: null };
    const { number, allowancesMm, foams, changedAt, changedBy } = row;
    return { number, settings: { allowancesMm, foams }, changedAt, changedByName: changedBy?.name ?? null };
  }

  /** What cushions of a workshop are made with today. */
  async rules(workshopId: string, manager?: EntityManager): Promise<CushionRules> {
    return cushionRules((await this.read(workshopId, manager)).settings);
  }

  /** A change that began from older settings than are in force is not written over them. */
  async save(
    { workshopId, userId }: MemberInfo,
    { baseNumber, settings }: { baseNumber: number; settings: unknown },
  ): Promise<KeptCushionSettings> {
    const wanted = parsed(settings);
    return this.dataSource.transaction(async (manager) => {
      await this.workshops.lock(manager, workshopId);
      const { number } = await this.read(workshopId, manager);
      if (number !== baseNumber) {
        const detail =
          'Somebody changed the cushion settings meanwhile. Read them again and change them anew.';
        throw Problem.conflict('settings-moved-on', detail, { currentNumber: number });
      }
      await manager.upsert(
        CushionSettingsRow,
        { workshopId, ...wanted, number: number + 1, changedAt: new Date(), changedById: userId },
        ['workshopId'],
      );
      await this.audit.record(manager, {
        workshopId,
        userId,
        action: 'cushion-settings.changed',
        subjectType: 'workshop',
        subjectId: workshopId,
        detail: { allowances: Object.keys(wanted.allowancesMm), foams: wanted.foams.length },
      });
      return this.read(workshopId, manager);
    });
  }
}

function parsed(settings: unknown): WorkshopCushions {
  const read = workshopCushionsSchema.safeParse(settings, { reportInput: true });
  if (read.success) return read.data;
  throw Problem.invalid(
    read.error.issues.map(({ path, code, message, input }) => {
      const text = JSON.stringify(input);
      const was = text === undefined ? 'nothing was sent' : text.length > 80 ? '' : `read ${text}`;
      return { path: ['settings', ...path].join('.'), code, message: was ? `${message}; ${was}` : message };
    }),
  );
}
