import { Module } from '@nestjs/common';
import { WorkshopsModule } from '../workshops/workshops.module';
import { CushionSettingsController } from './cushion-settings.controller';
import { CushionSettingsService } from './cushion-settings.service';

@Module({
  imports: [WorkshopsModule],
  controllers: [CushionSettingsController],
  providers: [CushionSettingsService],
  exports: [CushionSettingsService],
})
export class CushionSettingsModule {}
