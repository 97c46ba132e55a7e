import { Module } from '@nestjs/common';
import { UsersModule } from '../users/users.module';
import { WorkshopsService } from './workshops.service';

@Module({ imports: [UsersModule], providers: [WorkshopsService], exports: [WorkshopsService] })
export class WorkshopsModule {}
