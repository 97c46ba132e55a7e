import type { SetDocument } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import type { MemberInfo } from '../../common/access.decorator';
import { FitCheckService, type SitterNext, type Turns } from '../../fit-checks/fit-check.service';
import { ProductionsService } from '../../productions/productions.service';
import { DraftsService } from '../../sets/drafts.service';
import { SetAccess } from '../../sets/set-access';
import { SetsService } from '../../sets/sets.service';
import { CastService } from '../cast.service';
import type { CastMember } from '../entities/cast-member.entity';
import { castPerson } from '../known-person';
import type { MeasureNextDto, PersonNextDto } from './dto/measure-next.dto';

/** Places worked out anew for one request: some ten seconds of work. What was worked out lately is not counted. */
const MOST_PLACES = 40;

/** What to measure, and of whom not every place was looked at. */
interface Found {
  items: PersonNextDto[];
  leftOut: string[];
}

interface NamedDocument {
  name: string;
  document: SetDocument;
}

/** Which tape measures are worth a visit, told from the drafts that people sit in. */
@Injectable()
export class MeasureNextService {
  constructor(
    private readonly cast: CastService,
    private readonly sets: SetsService,
    private readonly access: SetAccess,
    private readonly drafts: DraftsService,
    private readonly productions: ProductionsService,
    private readonly fit: FitCheckService,
  ) {}

  /** Of everybody who sits in one set. */
  async ofSet(member: MemberInfo, productionId: string, setId: string): Promise<MeasureNextDto> {
    const { name } = await this.access.forReading(member, productionId, setId);
    const { document } = await this.drafts.get(member, productionId, setId);
    return told(await this.of(productionId, [{ name, document }], await this.cast.all(member, productionId)));
  }

  /** Of everybody, over all sets in use that they sit in. */
  async ofProduction(member: MemberInfo, productionId: string): Promise<MeasureNextDto> {
    const people = await this.cast.all(member, productionId);
    return told(await this.ofPeople(productionId, people));
  }

  /** Of some people of a production that the caller may see. */
  async ofPeople(productionId: string, people: readonly CastMember[]): Promise<Found> {
    return this.of(productionId, await this.sets.inUse(productionId), people);
  }

  private async of(
    productionId: string,
    sets: readonly NamedDocument[],
    people: readonly CastMember[],
  ): Promise<Found> {
    const { confidence } = await this.productions.workshopOf(productionId);
    const found = new Map<string, PersonNextDto>();
    const turns: Turns = { left: MOST_PLACES, leftOut: [] };
    for (const { name, document } of sets) {
      const sitters = this.fit.measureNext(document, people.map(castPerson), confidence, turns);
      for await (const sitter of sitters) {
        add(found, name, sitter);
      }
    }
    const items = [...found.values()].map((person) => ({
      ...person,
      order: person.order.toSorted((a, b) => b.settles - a.settles),
    }));
    return { items, leftOut: turns.leftOut };
  }
}

const told = ({ items, leftOut }: Found): MeasureNextDto => ({ items, leftOut: leftOut.length });

/** A person who sits twice has the two findings added up. */
function add(found: Map<string, PersonNextDto>, set: string, { castId, next }: SitterNext): void {
  const person = found.get(castId) ?? { castId, sets: [], uncertain: 0, order: [] };
  found.set(castId, person);
  if (!person.sets.includes(set)) person.sets.push(set);
  person.uncertain += next.uncertain.length;
  for (const { key, settles, ruleIds } of next.order) {
    const known = person.order.find((one) => one.key === key);
    if (!known) person.order.push({ key, settles, ruleIds: [...ruleIds] });
    else {
      known.settles += settles;
      known.ruleIds = [...new Set([...known.ruleIds, ...ruleIds])];
    }
  }
}
