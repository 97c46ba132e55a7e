import { Injectable } from '@nestjs/common';
import type { MemberInfo } from '../../common/access.decorator';
import { Problem } from '../../common/problem';
import { FitCheckService } from '../../fit-checks/fit-check.service';
import { ProductionsService } from '../../productions/productions.service';
import { WorkshopsService } from '../../workshops/workshops.service';
import { CastService } from '../cast.service';
import { MeasureNextService } from './measure-next.service';
import { measuringSheetPdf } from './paper/measuring-sheet-pdf';

/** Sheets to take along to a measuring: what to take of whom, what first, and how. */
@Injectable()
export class MeasuringSheetService {
  constructor(
    private readonly cast: CastService,
    private readonly next: MeasureNextService,
    private readonly productions: ProductionsService,
    private readonly workshops: WorkshopsService,
    private readonly fit: FitCheckService,
  ) {}

  /** Of one person, or of everybody. */
  async pdf(
    member: MemberInfo,
    productionId: string,
    castId: string | undefined,
  ): Promise<{ name: string; content: Buffer }> {
    const production = await this.productions.forReading(member, productionId);
    const people = castId
      ? [await this.cast.find(member, productionId, castId)]
      : await this.cast.all(member, productionId);
    if (people.length === 0) {
      throw Problem.conflict('nobody-to-measure', 'There is nobody in this production to measure yet.');
    }
    const workshop = await this.workshops.get(member.workshopId);
    const { items, leftOut } = await this.next.ofPeople(productionId, people);
    const content = measuringSheetPdf({
      people: people.map((person) => ({
        person,
        next: items.find((one) => one.castId === person.id),
        placesLeftOut: leftOut.filter((id) => id === person.id).length,
      })),
      ruleBook: this.fit.ruleBook,
      style: { system: production.units, roundTo: production.roundTo },
      paper: workshop.paper,
      timeZone: workshop.timeZone,
      workshop: workshop.name,
      productionName: production.name,
      at: new Date(),
    });
    return { name: `${castId ? people[0]?.name : production.name} measuring sheet`, content };
  }
}
