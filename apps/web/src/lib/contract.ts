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
  email: string;
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
  email: string;
  role: Role;
  invitedBy: string;
  hasAccount: boolean;
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
  setCount?: number;
  castCount?: number;
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
  statureMm?: number | null;
  statureSource?: 'measured' | 'told' | null;
  weightKg?: number | null;
  measured?: Partial<Record<TapeMeasureKey, TapeReading>>;
  shoeMm?: number;
  clothing?: Clothing;
  notes?: string;
  createdAt?: string;
}

export interface ImportProblem {
  column: string;
  read: string;
  accepted: string;
  message: string;
}

export interface ImportPreview {
  columns: string[];
  ignoredColumns: string[];
  rows: { line: number; value?: Partial<CastMember> | null; problems: ImportProblem[] }[];
}

export interface SetSummary {
  id: string;
  name: string;
  draftNumber: number;
  status?: 'active' | 'archived';
  lastRevision?: { letter: string; issuedAt: string; approved?: boolean } | null;
  pieceCount: number;
  seatedCount: number;
  counts?: Record<Verdict, number> | null;
  document?: SetDocument | null;
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
  number?: number;
  title: string;
  state: OrderState;
  setId: string;
  revisionLetter: string;
  neededBy?: string | null;
  upholstererName?: string | null;
  openQuestions?: number;
  updatedAt?: string;
}

export interface Draft {
  number: number;
  document: SetDocument;
  savedAt: string;
  savedBy: { id: string; name: string };
}

export type { FitSheet, SetDocument, Verdict };
