import {
  Body,
  Controller,
  Delete,
  Get,
  HttpCode,
  Param,
  Post,
  Req,
  Res,
  type StreamableFile,
  UploadedFile,
  UseInterceptors,
} from '@nestjs/common';
import { ApiConsumes, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { Access } from '../../common/access.decorator';
import { IdParam } from '../../common/id-param';
import { OrderLifeDto } from '../life/order-life.dto';
import { OrderLife } from '../life/order-life.service';
import { LinkLimits } from '../link-limits';
import { PrivatePage } from '../private-page.interceptor';
import { UploadFileDto } from './file.dto';
import { OrderFiles } from './files.service';
import { LinkFirst, type ReceivedFile, ReceiveFile } from './receive-file';
import { servedFile } from './served-file';

@ApiTags('order link')
@Controller('link/:token/files')
@Access('link')
@UseInterceptors(PrivatePage)
export class LinkFilesController {
  constructor(
    private readonly files: OrderFiles,
    private readonly life: OrderLife,
    private readonly limits: LinkLimits,
  ) {}

  @Post()
  @HttpCode(200)
  @UseInterceptors(LinkFirst, ReceiveFile)
  @ApiConsumes('multipart/form-data')
  @ApiOkResponse({ type: OrderLifeDto })
  async add(
    @Param('token') token: string,
    @Body() body: UploadFileDto,
    @UploadedFile() file?: ReceivedFile,
  ): Promise<OrderLifeDto> {
    await this.files.addByLink(token, file, body.cushionMark);
    return this.life.forLink(token);
  }

  @Get(':fileId')
  @ApiOkResponse({ schema: { type: 'string', format: 'binary' } })
  async read(
    @Param('token') token: string,
    @IdParam('fileId') fileId: string,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<StreamableFile> {
    await this.limits.reading(request);
    return servedFile(response, await this.files.readByLink(token, fileId));
  }

  @Delete(':fileId')
  @ApiOkResponse({ type: OrderLifeDto })
  async remove(
    @Param('token') token: string,
    @IdParam('fileId') fileId: string,
    @Req() request: Request,
  ): Promise<OrderLifeDto> {
    await this.limits.answering(token, request);
    await this.files.removeByLink(token, fileId);
    return this.life.forLink(token);
  }
}
