import { leastWornColour } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type EntityManager, In, IsNull, Not, type Repository } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { MemberInfo } from '../common/access.decorator';
import type { KeptRow } from '../common/kept-text';
import type { Page, PageQuery } from '../common/page.dto';
import { Problem } from '../common/problem';
import { readPage } from '../common/read-page';
import type { Production } from '../productions/entities/production.entity';
import { ProductionsService } from '../productions/productions.service';
import { readCastCsv, type ReadCsv } from './csv/read-cast-csv';
import type { CreateCastMemberDto, PatchCastMemberDto } from './dto/save-cast-member.dto';
import { CastMember, type TapeMeasures } from './entities/cast-member.entity';
import { USUAL_SHOE_MM } from './limits';
import { readMeasured } from './measured';

/** Erased people stay in sight only while a draft still has them at a place. */
const STILL_SEATED = `EXISTS (
  SELECT 1 FROM sets s JOIN set_drafts d ON d.set_id = s.id AND d.number = s.draft_number
  WHERE s.production_id = person.production_id AND d.document->'seating' @>
    jsonb_build_array(jsonb_build_object('sitter', jsonb_build_object('castId', person.id::text))))`;

@Injectable()
export class CastService {
  constructor(
    @InjectRepository(CastMember) private readonly people: Repository<CastMember>,
    private readonly productions: ProductionsService,
    private readonly audit: AuditService,
  ) {}

  async list(member: MemberInfo, productionId: string, query: PageQuery): Promise<Page<CastMember>> {
    await this.productions.forReading(member, productionId);
    const select = this.people
      .createQueryBuilder('person')
      .where('person.productionId = :productionId', { productionId })
      .andWhere(`(person.removedAt IS NULL OR ${STILL_SEATED})`);
    return readPage(select, query, {
      sortable: { name: 'person.name', role: 'person.role', createdAt: 'person.createdAt' },
      defaultSort: 'name',
      tieBreak: 'person.id',
      searchIn: ['person.name', 'person.role'],
    });
  }

  async find(member: MemberInfo, productionId: string, castId: string): Promise<CastMember> {
    await this.productions.forReading(member, productionId);
    return present(this.people.manager, productionId, castId);
  }

  /** Part of the caller's transaction: the person as they are now, kept from being erased until it ends. */
  async lockedMember(
    manager: EntityManager,
    member: MemberInfo,
    productionId: string,
    castId: string,
  ): Promise<CastMember> {
    await this.productions.forChanging(member, productionId);
    await this.productions.lockPeople(manager, productionId);
    return present(manager, productionId, castId);
  }

  async create(member: MemberInfo, productionId: string, dto: CreateCastMemberDto): Promise<CastMember> {
    await this.productions.forChanging(member, productionId);
    const measured = measuredOf(dto.measured);
    return this.people.manager.transaction(async (manager) => {
      const worn = await wornColours(manager, productionId);
      return manager.save(
        manager.create(CastMember, {
          productionId,
          name: dto.name,
          role: dto.role ?? '',
          bodyData: dto.bodyData ?? 'mixed',
          statureMm: dto.statureMm ?? null,
          statureSource: dto.statureSource ?? 'told',
          weightKg: dto.weightKg ?? null,
          age: dto.age ?? null,
          measured,
          shoeMm: dto.shoeMm ?? USUAL_SHOE_MM,
          clothing: dto.clothing ?? 'light',
          notes: dto.notes ?? '',
          colour: dto.colour ?? leastWornColour(worn),
          removedAt: null,
          removedNumber: null,
        }),
      );
    });
  }

  async patch(
    member: MemberInfo,
    productionId: string,
    castId: string,
    dto: PatchCastMemberDto,
  ): Promise<CastMember> {
    await this.productions.forChanging(member, productionId);
    const measured = dto.measured ? measuredOf(dto.measured) : undefined;
    return this.people.manager.transaction(async (manager) => {
      // Without the lock a person who is being erased could come back with the numbers read here.
      await this.productions.lockPeople(manager, productionId);
      const person = await present(manager, productionId, castId);
      person.name = dto.name ?? person.name;
      person.role = dto.role ?? person.role;
      person.bodyData = dto.bodyData ?? person.bodyData;
      if (dto.statureMm !== undefined) person.statureMm = dto.statureMm;
      person.statureSource = dto.statureSource ?? person.statureSource;
      if (dto.weightKg !== undefined) person.weightKg = dto.weightKg;
      if (dto.age !== undefined) person.age = dto.age;
      person.measured = measured ?? person.measured;
      person.shoeMm = dto.shoeMm ?? person.shoeMm;
      person.clothing = dto.clothing ?? person.clothing;
      person.notes = dto.notes ?? person.notes;
      person.colour = dto.colour ?? person.colour;
      return manager.save(person);
    });
  }

  async all(member: MemberInfo, productionId: string): Promise<CastMember[]> {
    await this.productions.forReading(member, productionId);
    return this.people.find({
      where: { productionId, removedAt: IsNull() },
      order: { name: 'ASC', id: 'ASC' },
    });
  }

  async previewImport(member: MemberInfo, productionId: string, csv: string): Promise<ReadCsv> {
    const production = await this.productions.forReading(member, productionId);
    return this.read(this.people.manager, production, csv);
  }

  /** Takes every good row; what was refused comes back with its reasons. */
  async import(member: MemberInfo, productionId: string, csv: string): Promise<ReadCsv> {
    const production = await this.productions.forChanging(member, productionId);
    return this.people.manager.transaction(async (manager) => {
      const read = await this.read(manager, production, csv);
      const worn = await wornColours(manager, productionId);
      const people = read.rows.flatMap(({ value }) => {
        if (!value) return [];
        const colour = leastWornColour(worn);
        worn.push(colour);
        const { statureMm = null, weightKg = null, age = null, shoeMm = USUAL_SHOE_MM } = value;
        return [
          manager.create(CastMember, { ...value, productionId, statureMm, weightKg, age, shoeMm, colour }),
        ];
      });
      await manager.save(people, { chunk: 200 });
      await this.audit.record(manager, {
        workshopId: member.workshopId,
        userId: member.userId,
        action: 'cast.imported',
        subjectType: 'production',
        subjectId: productionId,
        detail: { added: people.length, refused: read.rows.length - people.length },
      });
      return read;
    });
  }

  /** Those of these people who belong to the production, erased ones included. For other modules. */
  async among(productionId: string, ids: string[], manager?: EntityManager): Promise<CastMember[]> {
    if (ids.length === 0) return [];
    return (manager ?? this.people.manager).findBy(CastMember, { productionId, id: In(ids) });
  }

  /** What people typed about the others of a production: parts, notes, who measured them. */
  async textsOfOthers(manager: EntityManager, productionId: string, castId: string): Promise<KeptRow[]> {
    const others = await manager.findBy(CastMember, {
      productionId,
      id: Not(castId),
      removedAt: IsNull(),
    });
    return others.map(({ id, name, role, notes, measured }) => ({
      texts: [
        { where: `${name}, part`, text: role },
        { where: `${name}, notes`, text: notes },
        ...Object.values(measured).map(({ takenBy = '' }) => ({ where: `${name}, taken by`, text: takenBy })),
      ],
      rewrite: (change) =>
        manager.update(
          CastMember,
          { id },
          { role: change(role), notes: change(notes), measured: takenByChanged(measured, change) },
        ),
    }));
  }

  /** Part of the caller's transaction. Answers the name that was, and the one that stands in its stead. */
  async removePersonalData(
    manager: EntityManager,
    productionId: string,
    castId: string,
  ): Promise<{ name: string; newName: string }> {
    await this.productions.lockPeople(manager, productionId);
    const person = await present(manager, productionId, castId);
    const { name } = person;
    const { max } = (await manager
      .createQueryBuilder(CastMember, 'person')
      .select('COALESCE(MAX(person.removedNumber), 0)', 'max')
      .where('person.productionId = :id', { id: person.productionId })
      .getRawOne<{ max: number }>()) ?? { max: 0 };
    const removedNumber = max + 1;
    const newName = `removed sitter ${removedNumber}`;
    await manager.save(
      Object.assign(person, {
        name: newName,
        role: '',
        bodyData: 'mixed',
        statureMm: null,
        statureSource: 'told',
        weightKg: null,
        age: null,
        measured: {},
        shoeMm: USUAL_SHOE_MM,
        clothing: 'light',
        notes: '',
        removedAt: new Date(),
        removedNumber,
      } satisfies Partial<CastMember>),
    );
    return { name, newName };
  }

  /** Part of the caller's transaction: copies everyone; answers the copy's id by the original's. */
  async copyAll(
    manager: EntityManager,
    fromProductionId: string,
    toProductionId: string,
  ): Promise<Map<string, string>> {
    const people = await manager.findBy(CastMember, { productionId: fromProductionId });
    const copies = people.map(({ id: _id, createdAt: _created, updatedAt: _updated, ...rest }) =>
      manager.create(CastMember, { ...rest, productionId: toProductionId }),
    );
    const saved = await manager.save(copies, { chunk: 200 });
    return new Map(people.map(({ id }, index) => [id, saved[index]!.id]));
  }

  private async read(manager: EntityManager, production: Production, csv: string): Promise<ReadCsv> {
    const known = await manager.findBy(CastMember, { productionId: production.id, removedAt: IsNull() });
    return readCastCsv(
      csv,
      production.units,
      known.map(({ name }) => name),
    );
  }
}

async function present(manager: EntityManager, productionId: string, castId: string): Promise<CastMember> {
  const person = await manager.findOneBy(CastMember, { id: castId, productionId, removedAt: IsNull() });
  if (!person) throw Problem.notFound('cast member');
  return person;
}

async function wornColours(manager: EntityManager, productionId: string): Promise<number[]> {
  const people = await manager.find(CastMember, {
    where: { productionId },
    select: { id: true, colour: true },
  });
  return people.map(({ colour }) => colour);
}

function measuredOf(sent: Record<string, unknown> | undefined | null): TapeMeasures {
  const read = readMeasured(sent ?? {});
  if (!read.ok) throw Problem.invalid(read.fields);
  return read.value;
}

function takenByChanged(measured: TapeMeasures, change: (text: string) => string): TapeMeasures {
  const entries = Object.entries(measured).map(([key, measure]) => [
    key,
    measure.takenBy === undefined ? measure : { ...measure, takenBy: change(measure.takenBy) },
  ]);
  return Object.fromEntries(entries) as TapeMeasures;
}
