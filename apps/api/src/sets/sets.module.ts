import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { CastModule } from '../cast/cast.module';
import { CushionSettingsModule } from '../cushion-settings/cushion-settings.module';
import { FitChecksModule } from '../fit-checks/fit-checks.module';
import { ProductionsModule } from '../productions/productions.module';
import { WorkshopsModule } from '../workshops/workshops.module';
import { BuiltPartsController } from './built-parts.controller';
import { BuiltPartsService } from './built-parts.service';
import { DraftsController } from './drafts.controller';
import { DraftsService } from './drafts.service';
import { BuiltPart } from './entities/built-part.entity';
import { DesignedSet } from './entities/designed-set.entity';
import { RevisionApproval } from './entities/revision-approval.entity';
import { SetDraft } from './entities/set-draft.entity';
import { SetNote } from './entities/set-note.entity';
import { SetRevision } from './entities/set-revision.entity';
import { FitSheetFilesController } from './fit-sheet-files.controller';
import { FitSheetFilesService } from './fit-sheet-files.service';
import { FitSheetsService } from './fit-sheets.service';
import { NotesController } from './notes.controller';
import { NotesService } from './notes.service';
import { RevisionsController } from './revisions.controller';
import { RevisionsService } from './revisions.service';
import { SeatedPeople } from './seated-people.service';
import { SetAccess } from './set-access';
import { SetTexts } from './set-texts.service';
import { SetsController } from './sets.controller';
import { SetsService } from './sets.service';

@Module({
  imports: [
    TypeOrmModule.forFeature([BuiltPart, DesignedSet, RevisionApproval, SetDraft, SetNote, SetRevision]),
    ProductionsModule,
    CastModule,
    FitChecksModule,
    CushionSettingsModule,
    WorkshopsModule,
  ],
  controllers: [
    SetsController,
    DraftsController,
    RevisionsController,
    FitSheetFilesController,
    NotesController,
    BuiltPartsController,
  ],
  providers: [
    SetAccess,
    SeatedPeople,
    SetsService,
    DraftsService,
    RevisionsService,
    FitSheetsService,
    FitSheetFilesService,
    NotesService,
    BuiltPartsService,
    SetTexts,
  ],
  exports: [SetAccess, DraftsService, SetsService, RevisionsService, SetTexts],
})
export class SetsModule {}
