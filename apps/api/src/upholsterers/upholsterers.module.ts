import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { Upholsterer } from './entities/upholsterer.entity';
import { UpholsterersController } from './upholsterers.controller';
import { UpholsterersService } from './upholsterers.service';

@Module({
  imports: [TypeOrmModule.forFeature([Upholsterer])],
  controllers: [UpholsterersController],
  providers: [UpholsterersService],
  exports: [UpholsterersService],
})
export class UpholsterersModule {}
