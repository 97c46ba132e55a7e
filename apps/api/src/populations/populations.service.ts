import { MEASURE_KEYS, type WholeSummary } from '@settlewright/anthropometry';
import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { isUUID } from 'class-validator';
import { type EntityManager, In, type Repository } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import { seesMeasures } from '../cast/sees-measures';
import type { MemberInfo } from '../common/access.decorator';
import type { Page, PageQuery } from '../common/page.dto';
import { Problem } from '../common/problem';
import { readPage } from '../common/read-page';
import { builtInIds } from './built-in';
import type { CrowdData } from './crowd-data';
import { PopulationDetailsDto, PopulationDto } from './dto/population.dto';
import type { CreatePopulationDto, PopulationPreviewDto, PreviewPopulationDto } from './dto/upload.dto';
import { OwnPopulation } from './entities/own-population.entity';
import { PopulationRows } from './entities/population-rows.entity';
import { isWhole, mappingFaults } from './survey/check-mapping';
import { type CheckedSurvey, checkSurvey, keptRows, summaryOf } from './survey/read-people';
import { suggestMapping, withUnits } from './survey/suggest-mapping';
import { columnOf, readSurveyFile, shortened } from './survey/survey-file';

const FAULTS_SHOWN = 200;
const EXAMPLES = 3;

/** Everything but the summary, which is large. */
const LISTED = [
  'id',
  'workshopId',
  'name',
  'source',
  'women',
  'men',
  'leftOut',
  'read',
  'estimated',
  'addedById',
  'addedAt',
] as const satisfies (keyof OwnPopulation)[];

@Injectable()
export class PopulationsService {
  constructor(
    @InjectRepository(OwnPopulation) private readonly populations: Repository<OwnPopulation>,
    private readonly audit: AuditService,
  ) {}

  preview({ csv, mapping: sent }: PreviewPopulationDto): PopulationPreviewDto {
    const file = readSurveyFile(csv);
    const mapping = sent ? withUnits(file, sent) : suggestMapping(file);
    const faults = mappingFaults(file, mapping);
    const checked = isWhole(mapping, faults) ? checkSurvey(file, mapping) : undefined;
    const read = checked?.read ?? [];
    return {
      columns: file.headings.map((name) => ({
        name,
        examples: (columnOf(file, name) ?? []).slice(0, EXAMPLES).map(shortened),
      })),
      rows: file.rows.length,
      mapping,
      problems: [...faults, ...(checked?.tooFew ?? [])],
      women: checked?.women ?? 0,
      men: checked?.men ?? 0,
      leftOut: checked?.leftOut ?? 0,
      faults: checked?.faults.slice(0, FAULTS_SHOWN) ?? [],
      faultCount: checked?.faults.length ?? 0,
      read,
      estimated: checked ? MEASURE_KEYS.filter((key) => !read.includes(key)) : [],
    };
  }

  async create(member: MemberInfo, dto: CreatePopulationDto): Promise<PopulationDetailsDto> {
    const { name, source, mapping, keepRows = false } = dto;
    if (keepRows && member.role !== 'owner') {
      throw Problem.forbidden('owner-only', 'Only an owner may keep the rows of measured people.');
    }
    const file = readSurveyFile(dto.csv);
    const faults = mappingFaults(file, mapping);
    if (faults.length > 0) throw Problem.invalid(faults);
    const checked = checkSurvey(file, mapping);
    if (checked.tooFew.length > 0) throw Problem.invalid(checked.tooFew);
    const summary = summarised(checked, source);
    const id = await this.populations.manager.transaction(async (manager) => {
      const made = await manager.save(
        manager.create(OwnPopulation, {
          workshopId: member.workshopId,
          name,
          source,
          women: checked.women,
          men: checked.men,
          leftOut: checked.leftOut,
          read: summary.read,
          estimated: summary.estimated,
          summary,
          addedById: member.userId,
        }),
      );
      if (keepRows) {
        const csv = keptRows(file, mapping, checked);
        await manager.insert(PopulationRows, { populationId: made.id, csv });
      }
      const { women, men, leftOut } = checked;
      await this.record(manager, member, 'population.added', made.id, { women, men, leftOut, keepRows });
      return made.id;
    });
    return this.get(member, id);
  }

  async list(member: MemberInfo, query: PageQuery): Promise<Page<PopulationDto>> {
    const select = this.populations
      .createQueryBuilder('population')
      .select(LISTED.map((column) => `population.${column}`))
      .leftJoin('population.addedBy', 'adder')
      .addSelect(['adder.id', 'adder.name'])
      .where('population.workshopId = :workshopId', { workshopId: member.workshopId });
    const page = await readPage(select, query, {
      sortable: { name: 'population.name', addedAt: 'population.addedAt' },
      defaultSort: 'name',
      tieBreak: 'population.id',
      searchIn: ['population.name', 'population.source'],
    });
    const kept = await this.withRows(page.items.map(({ id }) => id));
    return { ...page, items: page.items.map((one) => PopulationDto.of(one, kept.has(one.id))) };
  }

  async get(member: MemberInfo, id: string): Promise<PopulationDetailsDto> {
    const population = await this.find(member.workshopId, id);
    const shown = PopulationDto.of(population, (await this.withRows([id])).has(id));
    return seesMeasures(member) ? { ...shown, summary: population.summary } : shown;
  }

  /** The kept rows, for the owner alone; that they were taken out is recorded. */
  async rows(member: MemberInfo, id: string): Promise<{ name: string; csv: string }> {
    const { name } = await this.find(member.workshopId, id);
    return this.populations.manager.transaction(async (manager) => {
      const rows = await manager.findOneBy(PopulationRows, { populationId: id });
      if (!rows) throw Problem.notFound('rows of measured people: they were not kept');
      await this.record(manager, member, 'population.rows-exported', id);
      return { name, csv: rows.csv };
    });
  }

  /** Forgets the rows; what was made of them stays. */
  async forgetRows(member: MemberInfo, id: string): Promise<void> {
    await this.find(member.workshopId, id);
    await this.populations.manager.transaction(async (manager) => {
      const { affected } = await manager.delete(PopulationRows, { populationId: id });
      if (affected) await this.record(manager, member, 'population.rows-forgotten', id);
    });
  }

  async remove(member: MemberInfo, id: string): Promise<void> {
    await this.find(member.workshopId, id);
    await this.populations.manager.transaction(async (manager) => {
      await manager.delete(OwnPopulation, { id });
      await this.record(manager, member, 'population.removed', id);
    });
  }

  /** People to draw from: one of those that come with the product, or one of the workshop's own. */
  async crowd(workshopId: string, populationId: string): Promise<CrowdData> {
    if (builtInIds().includes(populationId)) return { kind: 'built-in', id: populationId };
    const own = isUUID(populationId)
      ? await this.populations.findOneBy({ id: populationId, workshopId })
      : null;
    if (own) {
      const { id, name, source, summary } = own;
      return { kind: 'own', id, name, source, summary };
    }
    const accepted = `${builtInIds().join(', ')}, or the id of one of the workshop's own`;
    const message = `no population has the id "${shortened(populationId)}"; accepted: ${accepted}`;
    throw Problem.invalid([{ path: 'populationId', code: 'unknown-population', message }]);
  }

  private async find(workshopId: string, id: string): Promise<OwnPopulation> {
    const found = await this.populations.findOne({ where: { id, workshopId }, relations: { addedBy: true } });
    if (!found) throw Problem.notFound('population');
    return found;
  }

  private async withRows(ids: string[]): Promise<Set<string>> {
    const kept = await this.populations.manager.find(PopulationRows, {
      select: { populationId: true },
      where: { populationId: In(ids) },
    });
    return new Set(kept.map(({ populationId }) => populationId));
  }

  private record(
    manager: EntityManager,
    { workshopId, userId }: MemberInfo,
    action: string,
    subjectId: string,
    detail?: Record<string, unknown>,
  ): Promise<void> {
    const subject = { subjectType: 'population', subjectId };
    return this.audit.record(manager, {
      workshopId,
      userId,
      action,
      ...subject,
      ...(detail ? { detail } : {}),
    });
  }
}

/** The library says what keeps a table from being summarised, as a column in which everybody is alike. */
function summarised(checked: CheckedSurvey, source: string): WholeSummary {
  try {
    return summaryOf(checked, source);
  } catch (fault) {
    const message = `these rows do not make a population: ${fault instanceof Error ? fault.message : String(fault)}`;
    throw Problem.invalid([{ path: 'csv', code: 'not-summarised', message: message.slice(0, 400) }]);
  }
}
