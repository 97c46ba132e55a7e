import type { ShareOutcome, TapeMeasureKey } from '@settlewright/anthropometry';
import type { SetDocument } from '@settlewright/geometry';
import type { components } from './api-types.ts';

/** What the server sends, by the names the pages use. The types themselves are generated from the API. */
type Schema = components['schemas'];

/** What a member may do in a workshop. */
export type Role = Schema['Role'];
export type Session = Schema['SessionDto'];
export type SessionUser = Schema['UserDto'];
export type Membership = Schema['WorkshopOfUserDto'];
export type Workshop = Schema['WorkshopDto'];
export type Paper = Workshop['paper'];
export type Member = Schema['MemberDto'];
export type Invitation = Schema['InvitationDto'];
/** What the holder of an invitation sees before joining. */
export type InvitationOffer = Schema['OpenInvitationDto'];
export type Upholsterer = Schema['UpholstererDto'];
export type KeptArrangement = Omit<Schema['ArrangementDto'], 'document'> & { document: SetDocument };
export type Production = Schema['ProductionDto'];
export type UnitSystem = Production['units'];
export type RoundTo = Production['roundTo'];

export interface Page<T> {
  items: T[];
  total: number;
  page: number;
  pageSize: number;
}

export interface TapeReading {
  mm: number;
  takenBy?: string;
  takenOn?: string;
}

/** Carpenter and reviewer receive the first part only. */
export type CastMember = Schema['CastNameDto'] &
  Partial<Omit<Schema['CastMemberDto'], keyof Schema['CastNameDto'] | 'measured'>> & {
    measured?: Partial<Record<TapeMeasureKey, TapeReading>>;
  };

/** Somebody sat on a foam; for owner and designer alone. */
export type TestSit = Schema['TestSitDto'];
export type NewTestSit = Schema['AddTestSitDto'];

/** What to measure next of each person who sits in a set of the production. */
export type MeasureNext = Schema['MeasureNextDto'];
export type PersonNext = MeasureNext['items'][number];

/** A text that somebody typed with a person's name in it. */
export type NamedPlace = Schema['NamedPlaceDto'];
export type NamedPlaces = Schema['NamedPlacesDto'];
export type ImportRow = Schema['CastImportRowDto'];
export type ImportPreview = Schema['CastImportPreviewDto'];
export type ImportResult = Schema['CastImportDto'];

/** The document travels as plain JSON; the geometry library says what it is. */
export type SetSummary = Omit<Schema['SetDto'], 'document'> & { document: SetDocument };
export type Draft = Omit<Schema['DraftDto'], 'document'> & { document: SetDocument };

/** A count of many people on the server. */
export type ServerStudy = Omit<Schema['ListedStudyDto'], 'outcome'> & { outcome?: ShareOutcome };
export type OwnSurvey = Schema['PopulationDto'];
export type SurveyPreview = Schema['PopulationPreviewDto'];
export type SurveyMapping = Schema['MappingDto'];
export type OpenSurveyMapping = Schema['OpenMappingDto'];
export type SurveyUse = Schema['PopulationUseDto'];

export type OrderState = Schema['OrderState'];
export type OrderSummary = Schema['OrderSummaryDto'];

/** What passed between the two sides of an order. */
export type OrderLife = Schema['OrderLifeDto'];
