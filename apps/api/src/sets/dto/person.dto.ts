import { ApiProperty } from '@nestjs/swagger';
import type { User } from '../../users/entities/user.entity';

/** A member, as far as the others see one. */
export class PersonDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty()
  name: string;

  static of(id: string, user: User | undefined): PersonDto {
    return { id, name: user?.name ?? '' };
  }
}
