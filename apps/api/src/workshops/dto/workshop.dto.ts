import { CONFIDENCE_LIMITS } from '@settlewright/anthropometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsIn, IsOptional, IsTimeZone } from 'class-validator';
import { type Role, ROLES } from '../../common/access.decorator';
import { Line } from '../../common/account-fields';
import { IsConfidence } from '../confidence.decorator';
import { type Paper, PAPERS } from '../entities/workshop.entity';

export class CreateWorkshopDto {
  @Line(1, 80)
  name: string;
}

export class ChangeWorkshopDto {
  @Line(1, 80, { optional: true })
  name?: string;
  @Line(0, 40, { optional: true })
  telephone?: string;
  @ApiPropertyOptional({ enum: PAPERS, enumName: 'Paper' })
  @IsOptional()
  @IsIn(PAPERS)
  paper?: Paper;
  @ApiPropertyOptional({ description: 'as `Europe/Rome`' })
  @IsOptional()
  @IsTimeZone()
  timeZone?: string;
  @ApiPropertyOptional({
    type: Number,
    nullable: true,
    minimum: CONFIDENCE_LIMITS.lowest,
    maximum: CONFIDENCE_LIMITS.highest,
    description: 'probability that a verdict asks for, in hundredths; null for the default of the rule data',
  })
  @IsOptional()
  @IsConfidence()
  confidence?: number | null;
}

export class WorkshopDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty()
  name: string;
  @ApiProperty()
  telephone: string;
  @ApiProperty({ enum: PAPERS, enumName: 'Paper' })
  paper: Paper;
  @ApiProperty()
  timeZone: string;
  @ApiProperty({
    type: Number,
    nullable: true,
    description: 'probability that a verdict asks for; null: the default of the rule data',
  })
  confidence: number | null;
  @ApiProperty({
    type: String,
    format: 'date-time',
    nullable: true,
    description: 'when the confidence was last changed',
  })
  confidenceSetAt: string | null;
  @ApiProperty()
  isDemo: boolean;
  @ApiProperty({ enum: ROLES, enumName: 'Role', description: 'the role of whoever asks' })
  role: Role;
}

export class MemberDto {
  @ApiProperty({ format: 'uuid' })
  userId: string;
  @ApiProperty()
  name: string;
  @ApiPropertyOptional({ description: 'only for the owner' })
  email?: string;
  @ApiProperty({ enum: ROLES, enumName: 'Role' })
  role: Role;
  @ApiProperty()
  joinedAt: Date;
}

export class ChangeRoleDto {
  @ApiProperty({ enum: ROLES, enumName: 'Role' })
  @IsIn(ROLES)
  role: Role;
}
