import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { ProductionsModule } from '../productions/productions.module';
import { CastFilesController } from './cast-files.controller';
import { CastController } from './cast.controller';
import { CastService } from './cast.service';
import { CastMember } from './entities/cast-member.entity';

@Module({
  imports: [TypeOrmModule.forFeature([CastMember]), ProductionsModule],
  controllers: [CastController, CastFilesController],
  providers: [CastService],
  exports: [CastService],
})
export class CastModule {}
