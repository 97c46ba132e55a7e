import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager } from 'typeorm';
import { arrangementTexts } from '../../arrangements/arrangement-texts';
import type { MemberInfo } from '../../common/access.decorator';
import type { KeptRow } from '../../common/kept-text';
import { PersonName } from '../../common/person-name';
import { OrderTexts } from '../../cushion-orders/order-texts.service';
import { populationTexts } from '../../populations/population-texts';
import { productionTexts } from '../../productions/production-texts';
import { SetTexts } from '../../sets/set-texts.service';
import { studyTexts } from '../../studies/study-texts';
import { searchTexts } from '../../suggestions/search-erasure';
import { testSitTexts } from '../../test-sits/test-sit-erasure';
import { CastService } from '../cast.service';
import type { NamedPlaceDto, NamedPlacesDto } from './named-places.dto';

/** Places shown of each kind; the counts are of all. */
const SHOWN = 200;

/** Finds a person’s name in what people typed about a production and into what the whole workshop keeps, and takes it out. */
@Injectable()
export class ErasedNames {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly cast: CastService,
    private readonly sets: SetTexts,
    private readonly orders: OrderTexts,
  ) {}

  /** Where the name stands now; changes nothing. */
  async find(member: MemberInfo, productionId: string, castId: string): Promise<NamedPlacesDto> {
    const { name } = await this.cast.find(member, productionId, castId);
    const said = new PersonName(name);
    const whole = new Map<string, NamedPlaceDto>();
    const parts = new Map<string, NamedPlaceDto>();
    const rows = this.rows(this.dataSource.manager, member, productionId, castId, { toRewrite: false });
    for await (const { texts } of rows) {
      for (const { where, text, alreadySent = false } of texts) {
        for (const mention of said.mentions(text)) count(whole, { ...mention, where, alreadySent });
        for (const mention of said.partMentions(text)) count(parts, { ...mention, where, alreadySent });
      }
    }
    return {
      places: [...whole.values()].slice(0, SHOWN),
      placeCount: whole.size,
      parts: [...parts.values()].slice(0, SHOWN),
      partCount: parts.size,
    };
  }

  /** Part of the caller's transaction. Answers in how many texts the name stood, and how many had gone out. */
  async remove(
    manager: EntityManager,
    member: MemberInfo,
    productionId: string,
    person: { id: string; name: string },
  ): Promise<{ texts: number; alreadySent: number }> {
    const said = new PersonName(person.name);
    const found = { texts: 0, alreadySent: 0 };
    const rows = this.rows(manager, member, productionId, person.id, { toRewrite: true });
    for await (const row of rows) {
      const naming = row.texts.filter(({ text }) => said.isIn(text));
      if (naming.length === 0) continue;
      await row.rewrite((text) => said.removedFrom(text));
      found.texts += naming.length;
      found.alreadySent += naming.filter(({ alreadySent }) => alreadySent).length;
    }
    return found;
  }

  private async *rows(
    manager: EntityManager,
    member: MemberInfo,
    productionId: string,
    castId: string,
    options: { toRewrite: boolean },
  ): AsyncGenerator<KeptRow> {
    yield await productionTexts(manager, productionId);
    yield* await this.cast.textsOfOthers(manager, productionId, castId);
    yield* this.sets.of(manager, member, productionId, options);
    yield* await testSitTexts(manager, productionId);
    yield* this.orders.of(manager, productionId);
    // The rest belongs to the whole workshop: kept pieces, populations, and what studies and searches copied from those.
    yield* arrangementTexts(manager, member.workshopId);
    yield* populationTexts(manager, member.workshopId);
    yield* studyTexts(manager, member.workshopId, options);
    yield* searchTexts(manager, member.workshopId);
  }
}

/** The same words at the same place, as in one draft after another, are one place. */
function count(found: Map<string, NamedPlaceDto>, place: Omit<NamedPlaceDto, 'copies'>): void {
  const key = JSON.stringify([place.where, place.before, place.name, place.after]);
  const known = found.get(key);
  if (known) known.copies += 1;
  else found.set(key, { ...place, copies: 1 });
}
