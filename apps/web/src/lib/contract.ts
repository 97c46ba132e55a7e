import type { BodyData, Clothing, FitSheet, TapeMeasureKey, Verdict } from '@settlewright/anthropometry';
import type { SetDocument } from '@settlewright/geometry';

/** What a member may do in a workshop. */
export type Role = 'owner' | 'designer' | 'carpenter' | 'reviewer';

export type UnitSystem = 'feet-inches' | 'decimal-inches' | 'millimetres';
export type RoundTo = 8 | 16;

export interface Session {
  accessToken: string;
  expiresInSeconds: number;
  user: SessionUser;
  workshops: Membership[];
}

export interface SessionUser {
  id: string;
  name: string;
  email: string;
  emailConfirmed: boolean;
}

export interface Membership {
  id: string;
  name: string;
  role: Role;
  isDemo: boolean;
}

export interface Page<T> {
  items: T[];
  total: number;
  page: number;
  pageSize: number;
}

export interface Workshop {
  id: string;
  name: string;
  telephone: string;
  paper: 'a4' | 'letter';
  timeZone: string;
}

export interface Member {
  userId: string;
  name: string;
  /** Only the owner receives it. */
  email?: string;
  role: Role;
  joinedAt: string;
}

export interface Invitation {
  id: string;
  email: string;
  role: Role;
  expiresAt: string;
  createdAt: string;
}

/** What the holder of an invitation sees before joining. */
export interface InvitationOffer {
  workshopName: string;
  invitedByName: string;
  email: string;
  role: Role;
  expiresAt: string;
  /** True: the password of that account is asked; false: a name and a new password. */
  accountExists: boolean;
}

export interface Upholsterer {
  id: string;
  name: string;
  contactName: string;
  email: string;
  telephone: string;
  notes: string;
}

export interface Production {
  id: string;
  name: string;
  summary: string;
  units: UnitSystem;
  roundTo: RoundTo;
  status: 'active' | 'archived';
  createdAt: string;
  updatedAt: string;
}

export interface TapeReading {
  mm: number;
  takenBy?: string;
  takenOn?: string;
}

/** Carpenter and reviewer receive only the first four. */
export interface CastMember {
  id: string;
  name: string;
  role: string;
  colour: number;
  bodyData?: BodyData;
  statureMm?: number;
  statureSource?: 'measured' | 'told';
  weightKg?: number;
  measured?: Partial<Record<TapeMeasureKey, TapeReading>>;
  shoeMm?: number;
  clothing?: Clothing;
  notes?: string;
  createdAt?: string;
  /** The person was erased and still holds a place in a draft. */
  removed?: boolean;
}

export interface ImportProblem {
  column: string;
  read: string;
  accepted: string;
  message: string;
}

export interface ImportRow {
  /** Line of the file; the header stands on line 1. */
  line: number;
  /** Absent when the row cannot be taken. */
  value?: Pick<CastMember, 'name' | 'role' | 'statureMm' | 'statureSource' | 'weightKg' | 'measured'>;
  problems: ImportProblem[];
  /** Worth a look; the row is taken all the same. */
  warnings: ImportProblem[];
}

export interface ImportPreview {
  columns: { header: string; key: string; unit?: string }[];
  rows: ImportRow[];
  ignoredColumns: string[];
}

export interface RevisionSummary {
  letter: string;
  number: number;
  issuedAt: string;
  note: string;
  approval?: { decision: 'approved' | 'changes-wanted' };
}

export interface SetSummary {
  id: string;
  name: string;
  status: 'active' | 'archived';
  draftNumber: number;
  savedAt: string;
  lastRevision?: RevisionSummary;
  pieceCount: number;
  seatedCount: number;
  /** Verdicts of the draft; absent when they could not be made. */
  counts?: Record<Verdict, number>;
  document: SetDocument;
}

export type OrderState =
  | 'draft'
  | 'sent'
  | 'quoted'
  | 'agreed'
  | 'first-article'
  | 'in-work'
  | 'shipped'
  | 'received'
  | 'closed'
  | 'cancelled';

export interface OrderSummary {
  id: string;
  number: number;
  title: string;
  state: OrderState;
  setId: string;
  setName: string;
  revisionLetter: string;
  neededBy: string | null;
  cushionCount: number;
  upholsterer: { id: string; name: string; contactName: string } | null;
  openQuestions: number;
  updatedAt: string;
}

export interface Draft {
  number: number;
  document: SetDocument;
  savedAt: string;
  savedBy: { id: string; name: string };
}

export type { FitSheet, SetDocument, Verdict };
