import {
  type CushionRules,
  type CushionSpec,
  deriveCushions,
  keptCushionRules,
  type SetDocument,
} from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { RevisionsService } from '../sets/revisions.service';

export interface IssuedPlace {
  member: MemberInfo;
  productionId: string;
  setId: string;
  letter: string;
}

/** An issued revision with the cushions that follow from it. */
export interface IssuedSet {
  letter: string;
  document: SetDocument;
  issuedAt: Date;
  issuedByName: string;
  note: string;
  /** Allowances and foams that were in force when it was issued. */
  cushionRules: CushionRules;
  cushions: CushionSpec[];
}

@Injectable()
export class IssuedSets {
  constructor(private readonly revisions: RevisionsService) {}

  async read({ member, productionId, setId, letter }: IssuedPlace): Promise<IssuedSet> {
    const revision = await this.revisions.find(member, productionId, setId, letter);
    const cushionRules = keptCushionRules(revision.cushionRules);
    return {
      letter: revision.letter,
      document: revision.document,
      issuedAt: revision.issuedAt,
      issuedByName: revision.issuedBy?.name ?? '',
      note: revision.note,
      cushionRules,
      cushions: deriveCushions(revision.document, cushionRules.settings),
    };
  }

  /** The cushions an order may ask for; marks that the revision does not have are named in the refusal. */
  async cushions(place: IssuedPlace, marks: readonly string[] | null): Promise<CushionSpec[]> {
    const issued = await this.read(place);
    const known = new Set(issued.cushions.map(({ mark }) => mark));
    if (known.size === 0) {
      throw Problem.invalid([
        {
          path: 'revisionLetter',
          code: 'no-cushions',
          message: `revision ${place.letter} has no cushions to order: no bench or seat with a cushion`,
        },
      ]);
    }
    const strange = (marks ?? []).filter((mark) => !known.has(mark));
    if (strange.length > 0) {
      throw Problem.invalid([
        {
          path: 'cushionMarks',
          code: 'unknown-mark',
          message: `revision ${place.letter} has ${[...known].join(', ')}; read ${strange.join(', ')}`,
        },
      ]);
    }
    return this.select(issued, marks);
  }

  select(issued: IssuedSet, marks: readonly string[] | null): CushionSpec[] {
    return marks === null ? issued.cushions : issued.cushions.filter(({ mark }) => marks.includes(mark));
  }
}
