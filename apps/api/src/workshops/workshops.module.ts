import { Module } from '@nestjs/common';
import { MembersController } from './members.controller';
import { MembersService } from './members.service';
import { WorkshopsController } from './workshops.controller';
import { WorkshopsService } from './workshops.service';

@Module({
  controllers: [WorkshopsController, MembersController],
  providers: [WorkshopsService, MembersService],
  exports: [WorkshopsService],
})
export class WorkshopsModule {}
