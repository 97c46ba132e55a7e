import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsIn, IsOptional, IsTimeZone } from 'class-validator';
import { type Role, ROLES } from '../../common/access.decorator';
import { Line } from '../../common/account-fields';
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
