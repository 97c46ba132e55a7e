import {
  Body,
  Controller,
  Delete,
  Get,
  HttpCode,
  Post,
  Res,
  type StreamableFile,
  UploadedFile,
  UseInterceptors,
} from '@nestjs/common';
import { ApiConsumes, ApiOkResponse, ApiParam, ApiTags } from '@nestjs/swagger';
import type { Response } from 'express';
import { Access, Member, type MemberInfo } from '../../common/access.decorator';
import { IdParam } from '../../common/id-param';
import { OrderLifeDto } from '../life/order-life.dto';
import { OrderLife } from '../life/order-life.service';
import { UploadFileDto } from './file.dto';
import { OrderFiles } from './files.service';
import { type ReceivedFile, ReceiveFile } from './receive-file';
import { servedFile } from './served-file';

@ApiTags('cushion orders')
@ApiParam({ name: 'workshopId', format: 'uuid' })
@ApiParam({ name: 'productionId', format: 'uuid' })
@ApiParam({ name: 'orderId', format: 'uuid' })
@Controller('workshops/:workshopId/productions/:productionId/orders/:orderId/files')
@Access('owner', 'designer')
export class FilesController {
  constructor(
    private readonly files: OrderFiles,
    private readonly life: OrderLife,
  ) {}

  @Post()
  @HttpCode(200)
  @UseInterceptors(ReceiveFile)
  @ApiConsumes('multipart/form-data')
  @ApiOkResponse({ type: OrderLifeDto })
  async add(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @Body() body: UploadFileDto,
    @UploadedFile() file?: ReceivedFile,
  ): Promise<OrderLifeDto> {
    const place = { workshopId: member.workshopId, productionId, orderId };
    await this.files.add(member, place, file, body.cushionMark);
    return this.life.forMember(place);
  }

  @Get(':fileId')
  @ApiOkResponse({ schema: { type: 'string', format: 'binary' } })
  async read(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @IdParam('fileId') fileId: string,
    @Res({ passthrough: true }) response: Response,
  ): Promise<StreamableFile> {
    const place = { workshopId: member.workshopId, productionId, orderId };
    return servedFile(response, await this.files.read(place, fileId));
  }

  @Delete(':fileId')
  @ApiOkResponse({ type: OrderLifeDto })
  async remove(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @IdParam('fileId') fileId: string,
  ): Promise<OrderLifeDto> {
    const place = { workshopId: member.workshopId, productionId, orderId };
    await this.files.remove(member, place, fileId);
    return this.life.forMember(place);
  }
}
