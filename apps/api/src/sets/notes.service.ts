import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { Repository } from 'typeorm';
import type { MemberInfo } from '../common/access.decorator';
import type { Page, PageQuery } from '../common/page.dto';
import { Problem } from '../common/problem';
import { readPage } from '../common/read-page';
import type { CreateNoteDto } from './dto/note.dto';
import { SetNote } from './entities/set-note.entity';
import { SetAccess } from './set-access';

@Injectable()
export class NotesService {
  constructor(
    @InjectRepository(SetNote) private readonly notes: Repository<SetNote>,
    private readonly access: SetAccess,
  ) {}

  async list(
    member: MemberInfo,
    productionId: string,
    setId: string,
    query: PageQuery,
  ): Promise<Page<SetNote>> {
    await this.access.forReading(member, productionId, setId);
    const select = this.notes
      .createQueryBuilder('note')
      .leftJoinAndSelect('note.createdBy', 'author')
      .leftJoinAndSelect('note.resolvedBy', 'resolver')
      .where('note.setId = :setId', { setId });
    return readPage(select, query, {
      sortable: { createdAt: 'note.createdAt' },
      defaultSort: 'createdAt',
      tieBreak: 'note.id',
      searchIn: ['note.text'],
    });
  }

  async create(
    member: MemberInfo,
    productionId: string,
    setId: string,
    dto: CreateNoteDto,
  ): Promise<SetNote> {
    await this.access.forChanging(member, productionId, setId);
    const { id } = await this.notes.save(
      this.notes.create({
        setId,
        kind: dto.kind,
        text: dto.text,
        pieceId: dto.pieceId ?? null,
        createdById: member.userId,
      }),
    );
    return this.one(setId, id);
  }

  /** Whoever designs may settle any note, the others their own. */
  async resolve(
    member: MemberInfo,
    productionId: string,
    setId: string,
    noteId: string,
    resolved: boolean,
  ): Promise<SetNote> {
    await this.access.forChanging(member, productionId, setId);
    const note = await this.one(setId, noteId);
    const designs = member.role === 'owner' || member.role === 'designer';
    if (!designs && note.createdById !== member.userId) {
      throw Problem.forbidden(
        'not-your-note',
        'Only its author, a designer or an owner may settle this note.',
      );
    }
    await this.notes.update(
      { id: note.id },
      resolved
        ? { resolvedAt: note.resolvedAt ?? new Date(), resolvedById: note.resolvedById ?? member.userId }
        : { resolvedAt: null, resolvedById: null },
    );
    return this.one(setId, noteId);
  }

  private async one(setId: string, noteId: string): Promise<SetNote> {
    const note = await this.notes.findOne({
      where: { id: noteId, setId },
      relations: { createdBy: true, resolvedBy: true },
    });
    if (!note) throw Problem.notFound('note');
    return note;
  }
}
