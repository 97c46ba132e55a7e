import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsIn, IsOptional, IsString, MaxLength } from 'class-validator';
import { type Role, ROLES } from '../../common/access.decorator';
import { EmailAddress, Line } from '../../common/account-fields';

export class InviteDto {
  @EmailAddress()
  email: string;
  @ApiProperty({ enum: ROLES, enumName: 'Role' })
  @IsIn(ROLES)
  role: Role;
}

export class PersonNameDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty()
  name: string;
}

export class InvitationDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty()
  email: string;
  @ApiProperty({ enum: ROLES, enumName: 'Role' })
  role: Role;
  @ApiProperty({ type: PersonNameDto })
  invitedBy: PersonNameDto;
  @ApiProperty()
  createdAt: Date;
  @ApiProperty()
  expiresAt: Date;
}

/** What the mailed link shows before it is accepted. */
export class OpenInvitationDto {
  @ApiProperty()
  workshopName: string;
  @ApiProperty()
  invitedByName: string;
  @ApiProperty()
  email: string;
  @ApiProperty({ enum: ROLES, enumName: 'Role' })
  role: Role;
  @ApiProperty()
  expiresAt: Date;
  @ApiProperty({ description: 'true: the password of that account is asked; false: name and a new password' })
  accountExists: boolean;
}

export class AcceptInvitationDto {
  @Line(1, 80, { optional: true })
  name?: string;
  @ApiPropertyOptional({ description: 'not asked of somebody who is signed in with this address' })
  @IsOptional()
  @IsString()
  @MaxLength(200)
  password?: string;
}
