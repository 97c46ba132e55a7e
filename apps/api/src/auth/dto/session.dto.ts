import { ApiProperty } from '@nestjs/swagger';
import { type Role, ROLES } from '../../common/access.decorator';

export class UserDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty()
  name: string;
  @ApiProperty()
  email: string;
  @ApiProperty()
  emailConfirmed: boolean;
}

export class WorkshopOfUserDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty()
  name: string;
  @ApiProperty({ enum: ROLES, enumName: 'Role' })
  role: Role;
  @ApiProperty()
  isDemo: boolean;
}

export class MeDto {
  @ApiProperty({ type: UserDto })
  user: UserDto;
  @ApiProperty({ type: [WorkshopOfUserDto] })
  workshops: WorkshopOfUserDto[];
}

export class SessionDto extends MeDto {
  @ApiProperty()
  accessToken: string;
  @ApiProperty()
  expiresInSeconds: number;
}
