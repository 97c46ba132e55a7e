import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { PersonDto } from '../../sets/dto/person.dto';
import type { DocumentJob } from '../entities/document-job.entity';
import { JOB_STATES, type JobState } from '../job-states';

export class DocumentJobDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty({ enum: JOB_STATES })
  state: JobState;
  @ApiPropertyOptional({ description: 'of the document; either this or `revisionLetter`' })
  draftNumber?: number;
  @ApiPropertyOptional()
  revisionLetter?: string;
  @ApiPropertyOptional({ description: 'women of 100 people; absent for a population of one sex' })
  womenPercent?: number;
  @ApiProperty()
  ruleVersion: string;
  @ApiProperty({ type: PersonDto })
  startedBy: PersonDto;
  @ApiProperty({ format: 'date-time' })
  startedAt: string;
  @ApiPropertyOptional({ format: 'date-time' })
  endedAt?: string;
  @ApiPropertyOptional({ description: 'why it failed' })
  fault?: string;
}

export function documentJobFields(job: DocumentJob): DocumentJobDto {
  const { id, state, draftNumber, revisionLetter, womenPercent, ruleVersion, endedAt, fault } = job;
  return {
    id,
    state,
    ...(draftNumber === null ? {} : { draftNumber }),
    ...(revisionLetter === null ? {} : { revisionLetter }),
    ...(womenPercent === null ? {} : { womenPercent }),
    ruleVersion,
    startedBy: PersonDto.of(job.startedById, job.startedBy),
    startedAt: job.startedAt.toISOString(),
    ...(endedAt ? { endedAt: endedAt.toISOString() } : {}),
    ...(fault === null ? {} : { fault }),
  };
}
