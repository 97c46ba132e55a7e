import { fail, ok, type Result } from '../units/result.ts';
import { SCHEMA_VERSION, setDocumentSchema, type SetDocument } from './document.ts';
import { leafFault } from '../pieces/table-leaves.ts';
import { mayHaveCushion } from './cushion-choices.ts';
import { placeExists } from './seating.ts';
import { upgraded } from './upgrades.ts';

/** Largest document that is read, in bytes of JSON. */
export const MAX_DOCUMENT_BYTES = 1_000_000;

/** Most field errors reported at once. */
const MAX_FIELDS = 50;

/** One field that was wrong. */
export interface DocumentFieldError {
  /** Path such as `pieces.3.lengthMm`. */
  path: string;
  code: string;
  message: string;
}

/** Why a document was not taken. */
export interface DocumentError {
  code: 'not-a-document' | 'too-large' | 'newer-layout' | 'unknown-layout' | 'invalid';
  message: string;
  fields: DocumentFieldError[];
}

/**
 * Reads a set document: upgrades an older layout, checks every field and what fields mean together.
 *
 * @param json - plain JSON, as parsed
 * @returns the document, or what is wrong with it; nothing is repaired
 */
export function readSetDocument(json: unknown): Result<SetDocument, DocumentError> {
  const refuse = (code: DocumentError['code'], message: string, fields: DocumentFieldError[] = []) =>
    fail<DocumentError>({ code, message, fields });
  if (typeof json !== 'object' || json === null || Array.isArray(json)) {
    return refuse('not-a-document', 'A set document is a JSON object.');
  }
  const bytes = jsonBytes(json);
  if (bytes > MAX_DOCUMENT_BYTES) {
    return refuse('too-large', `A set document has at most 1,000,000 bytes; ${bytes} were read.`);
  }
  const version = (json as Record<string, unknown>)['schemaVersion'];
  if (typeof version !== 'number' || !Number.isInteger(version) || version < 1) {
    return refuse(
      'unknown-layout',
      `schemaVersion must be a whole number from 1; ${shown(version)} was read.`,
    );
  }
  if (version > SCHEMA_VERSION) {
    return refuse(
      'newer-layout',
      `This document has layout ${version}; this program reads up to ${SCHEMA_VERSION}. Nothing was changed.`,
    );
  }
  const current = upgraded(json as Record<string, unknown>, version, SCHEMA_VERSION);
  const parsed = setDocumentSchema.safeParse(current, { reportInput: true });
  if (!parsed.success) {
    const fields = parsed.error.issues.slice(0, MAX_FIELDS).map((issue) => ({
      path: issue.path.join('.'),
      code: issue.code,
      message: `${issue.message}; ${shown(issue.input)} was read`,
    }));
    return refuse('invalid', summary(fields), fields);
  }
  const fields = meaningErrors(parsed.data);
  return fields.length > 0 ? refuse('invalid', summary(fields), fields) : ok(parsed.data);
}

/**
 * A set with nothing in it.
 *
 * @returns a document of the present layout
 */
export function emptySetDocument(): SetDocument {
  return {
    schemaVersion: SCHEMA_VERSION,
    pieces: [],
    seating: [],
    asked: { backPosture: 'dining', trafficBehind: 'none' },
    knownDifferences: [],
  };
}

/** What no single field can say: ids, marks and seating that contradict each other. */
function meaningErrors(document: SetDocument): DocumentFieldError[] {
  const errors: DocumentFieldError[] = [];
  const unique = (seen: Set<string>, value: string, path: string, message: string) => {
    if (seen.has(value)) errors.push({ path, code: 'duplicate', message });
    seen.add(value);
  };
  const [ids, marks, places, people] = [0, 1, 2, 3].map(() => new Set<string>()) as [
    Set<string>,
    Set<string>,
    Set<string>,
    Set<string>,
  ];
  document.pieces.forEach((piece, i) => {
    unique(ids, piece.id, `pieces.${i}.id`, `Two pieces have the id “${piece.id}”`);
    unique(marks, piece.mark, `pieces.${i}.mark`, `Two pieces have the mark ${piece.mark}`);
    errors.push(...pieceErrors(piece, `pieces.${i}`));
  });
  const known = new Set<string>();
  document.knownDifferences.forEach(({ id }, i) =>
    unique(known, id, `knownDifferences.${i}.id`, `Two known differences have the id “${id}”`),
  );
  const groups = new Set<string>();
  document.groups?.forEach(({ id, name, pieceIds }, i) => {
    unique(groups, id, `groups.${i}.id`, `Two groups have the id “${id}”`);
    const lost = pieceIds.find((pieceId) => !ids.has(pieceId));
    if (lost !== undefined) {
      const message = `The group “${name}” holds a piece “${lost}” that is not in the set`;
      errors.push({ path: `groups.${i}.pieceIds`, code: 'no-such-piece', message });
    }
  });
  const views = new Set<string>();
  document.views?.forEach(({ id }, i) => unique(views, id, `views.${i}.id`, `Two views have the id “${id}”`));
  const lines = new Set<string>();
  document.dimensions?.forEach(({ id, ends }, i) => {
    unique(lines, id, `dimensions.${i}.id`, `Two dimension lines have the id “${id}”`);
    const lost = ends.find(({ pieceId }) => !ids.has(pieceId));
    if (lost !== undefined) {
      const message = `The dimension line “${id}” hangs on a piece “${lost.pieceId}” that is not in the set`;
      errors.push({ path: `dimensions.${i}.ends`, code: 'no-such-piece', message });
    }
  });
  for (const key of Object.keys(document.cushions ?? {})) {
    if (mayHaveCushion(document, key)) continue;
    const message = `There is no piece of the set that has a cushion “${key}”`;
    errors.push({ path: `cushions.${key}`, code: 'no-such-cushion', message });
  }
  if (errors.length > 0) return errors;
  document.seating.forEach((seat, i) => {
    const where = `${seat.pieceId}:${seat.place}`;
    if (!placeExists(document, seat.pieceId, seat.place)) {
      const message = `There is no place ${seat.place} on piece “${seat.pieceId}”`;
      errors.push({ path: `seating.${i}`, code: 'no-such-place', message });
    }
    unique(places, where, `seating.${i}`, `Two people sit at place ${seat.place} of “${seat.pieceId}”`);
    if (seat.sitter.kind === 'cast') {
      unique(people, seat.sitter.castId, `seating.${i}.sitter.castId`, 'One person sits at two places');
    }
  });
  return errors;
}

function pieceErrors(piece: SetDocument['pieces'][number], path: string): DocumentFieldError[] {
  if (piece.kind === 'table') {
    const message = leafFault(piece);
    return message === undefined ? [] : [{ path: `${path}.leaves`, code: 'too_big', message }];
  }
  if (piece.kind !== 'bench') return [];
  const inner = piece.lengthMm - piece.ends.left.thicknessMm - piece.ends.right.thicknessMm;
  if (inner >= 200) return [];
  const message = `The ends of ${piece.mark} leave ${Math.round(inner)} mm to sit on; at least 200 mm are needed`;
  return [{ path: `${path}.ends`, code: 'too_big', message }];
}

function summary(fields: DocumentFieldError[]): string {
  const [first] = fields;
  const rest = fields.length - 1;
  const more = rest > 0 ? ` (and ${rest} more)` : '';
  return first === undefined ? 'The document is not valid.' : `${first.path}: ${first.message}${more}.`;
}

function shown(value: unknown): string {
  if (value === undefined) return 'nothing';
  const text = typeof value === 'string' ? `“${value}”` : (JSON.stringify(value) ?? 'nothing');
  return text.length > 60 ? `${text.slice(0, 60)}…` : text;
}

/** Bytes of the JSON text in UTF-8. */
function jsonBytes(json: object): number {
  const text = JSON.stringify(json);
  let bytes = text.length;
  for (let i = 0; i < text.length; i += 1) {
    const code = text.charCodeAt(i);
    if (code > 0x7f) bytes += code > 0x7ff && (code < 0xd800 || code > 0xdfff) ? 2 : 1;
  }
  return bytes;
}
