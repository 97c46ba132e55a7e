import { Body, Controller, Get, Patch, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { type Page, PageOf, PageQuery } from '../common/page.dto';
import { CreateNoteDto, NoteDto, ResolveNoteDto } from './dto/note.dto';
import { NotesService } from './notes.service';

@ApiTags('sets')
@Controller('workshops/:workshopId/productions/:productionId/sets/:setId/notes')
export class NotesController {
  constructor(private readonly notes: NotesService) {}

  @Get()
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: PageOf(NoteDto) })
  async list(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Query() query: PageQuery,
  ): Promise<Page<NoteDto>> {
    const page = await this.notes.list(member, productionId, setId, query);
    return { ...page, items: page.items.map((note) => NoteDto.of(note)) };
  }

  @Post()
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiCreatedResponse({ type: NoteDto })
  async create(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Body() dto: CreateNoteDto,
  ): Promise<NoteDto> {
    return NoteDto.of(await this.notes.create(member, productionId, setId, dto));
  }

  @Patch(':noteId')
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: NoteDto })
  async resolve(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @IdParam('noteId') noteId: string,
    @Body() dto: ResolveNoteDto,
  ): Promise<NoteDto> {
    return NoteDto.of(await this.notes.resolve(member, productionId, setId, noteId, dto.resolved));
  }
}
