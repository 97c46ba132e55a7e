import { Controller, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../../common/access.decorator';
import { IdParam } from '../../common/id-param';
import { ProductionDto } from '../dto/production.dto';
import { ProductionDuplicationService } from './production-duplication.service';

@ApiTags('productions')
@Controller('workshops/:workshopId/productions/:productionId/duplicate')
export class ProductionDuplicationController {
  constructor(private readonly duplication: ProductionDuplicationService) {}

  @Post()
  @Access('owner', 'designer')
  @ApiCreatedResponse({ type: ProductionDto })
  async duplicate(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
  ): Promise<ProductionDto> {
    return ProductionDto.of(await this.duplication.duplicate(member, productionId));
  }
}
