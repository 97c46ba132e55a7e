import type { SetDocument } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { CastService } from '../cast/cast.service';
import type { CastMember } from '../cast/entities/cast-member.entity';

/** The cast members that documents name. */
@Injectable()
export class SeatedPeople {
  constructor(private readonly cast: CastService) {}

  of(
    productionId: string,
    documents: readonly SetDocument[],
    manager?: EntityManager,
  ): Promise<CastMember[]> {
    return this.cast.among(productionId, [...new Set(documents.flatMap(castIdsOf))], manager);
  }
}

export function castIdsOf(document: SetDocument): string[] {
  return document.seating.flatMap(({ sitter }) => (sitter.kind === 'cast' ? [sitter.castId] : []));
}
