import type { KnownPerson } from '@settlewright/anthropometry';
import { Injectable } from '@nestjs/common';
import { CastService } from '../cast/cast.service';
import { type CastPerson, castPerson } from '../cast/known-person';
import { USUAL_SHOE_MM } from '../cast/limits';
import { readMeasured } from '../cast/measured';
import type { MemberInfo } from '../common/access.decorator';
import { Problem, type ProblemField } from '../common/problem';
import { FitCheckService } from '../fit-checks/fit-check.service';
import { answerFields } from './answer-fields';
import type { AskStandInDto, StandInDto, StrangerDto } from './dto/stand-in.dto';
import { type Version, type VersionPlace, VersionsService } from './versions.service';

/** How far the sit of somebody else can be trusted for a cast member. */
@Injectable()
export class StandInsService {
  constructor(
    private readonly versions: VersionsService,
    private readonly cast: CastService,
    private readonly fit: FitCheckService,
  ) {}

  async of(member: MemberInfo, place: VersionPlace, asked: AskStandInDto): Promise<StandInDto> {
    const version = await this.versions.find(member, { ...place, draftNumber: asked.draftNumber });
    const castMember = readSeat(version, asked.placeId);
    const standIn = await this.readStandIn(member, place.productionId, asked, castMember);
    const checks = this.fit.standIn(
      { document: version.document, placeId: asked.placeId, confidence: version.confidence },
      { castMember: castMember.person, standIn },
    );
    if (!checks) throw Problem.invalid([noPlace(version, asked.placeId)]);
    const { ruleBook } = this.fit;
    const told = checks.filter(({ answer }) => answer !== 'notAsked').map(({ ruleId }) => ruleId);
    return {
      ...answerFields(version, ruleBook, told),
      placeId: asked.placeId,
      castId: castMember.id,
      checks,
      littleSaidMm: ruleBook.standIn.littleSaidMm,
    };
  }

  private async readStandIn(
    member: MemberInfo,
    productionId: string,
    { castId, person }: AskStandInDto,
    castMember: CastPerson,
  ): Promise<KnownPerson> {
    if ((castId === undefined) === (person === undefined)) {
      const read = castId === undefined ? 'neither' : 'both';
      const message = `read ${read}; accepted: castId of a cast member, or person for somebody else`;
      throw Problem.invalid([{ path: 'castId', code: 'one-stand-in', message }]);
    }
    if (person !== undefined) return stranger(person);
    if (castId === castMember.id) {
      const message = 'read the person who sits there; accepted: somebody else of the cast';
      throw Problem.invalid([{ path: 'castId', code: 'same-person', message }]);
    }
    return castPerson(await this.cast.find(member, productionId, castId ?? '')).person;
  }
}

function readSeat(version: Version, placeId: string): CastPerson {
  const seat = version.document.seating.find(({ pieceId, place }) => `${pieceId}:${place}` === placeId);
  const { sitter } = seat ?? {};
  const person = sitter?.kind === 'cast' ? version.people.find(({ id }) => id === sitter.castId) : undefined;
  if (!person || person.noBody) throw Problem.invalid([noPlace(version, placeId)]);
  return person;
}

function noPlace({ document }: Version, placeId: string): ProblemField {
  const taken = document.seating.flatMap(({ pieceId, place, sitter }) =>
    sitter.kind === 'cast' ? [`${pieceId}:${place}`] : [],
  );
  const accepted = taken.length === 0 ? 'none: nobody of the cast sits here' : taken.slice(0, 60).join(', ');
  const message = `nobody of the cast whose body is known sits at "${placeId}"; accepted: ${accepted}`;
  return { path: 'placeId', code: 'unknown-place', message };
}

function stranger(dto: StrangerDto): KnownPerson {
  const read = readMeasured(dto.measured ?? {});
  const faults: ProblemField[] = read.ok
    ? []
    : read.fields.map((field) => ({ ...field, path: `person.${field.path}` }));
  if (typeof dto.statureMm !== 'number') {
    const message = 'read nothing; accepted: the height of who tries the seat, in millimetres';
    faults.push({ path: 'person.statureMm', code: 'required', message });
  }
  if (faults.length > 0 || !read.ok) throw Problem.invalid(faults);
  return {
    bodyData: dto.bodyData ?? 'mixed',
    stature: { mm: dto.statureMm as number, source: dto.statureSource ?? 'measured' },
    ...(typeof dto.weightKg === 'number' ? { weightKg: dto.weightKg } : {}),
    ...(typeof dto.age === 'number' ? { age: dto.age } : {}),
    measured: Object.fromEntries(Object.entries(read.value).map(([key, { mm }]) => [key, mm])),
    shoeMm: dto.shoeMm ?? USUAL_SHOE_MM,
    clothing: dto.clothing ?? 'light',
  };
}
