import type { z } from 'zod';
import { pieceSchema, type Piece, type PieceKind, type SetDocument } from '../room/document.ts';
import { withPath } from '../room/leaves.ts';
import { withWallEndKept } from '../room/wall-end.ts';
import { withoutLostSeats } from '../room/seating.ts';
import { fail, ok, type Result } from '../units/result.ts';
import type { Parameter, ParameterSpec } from './kind.ts';
import { definitionOf } from './kinds.ts';

/** Why a parameter could not be set. Values in the parameter's unit. */
export interface ParameterError {
  key: string;
  label: string;
  value: number | string;
  min: number;
  max: number;
  message: string;
}

const POSITION: readonly ParameterSpec<PieceKind>[] = [
  {
    key: 'at.xMm',
    label: 'Position across',
    kind: 'length',
    group: 'more',
    describes: "the room's origin to the piece's origin, to the right",
  },
  {
    key: 'at.zMm',
    label: 'Position along',
    kind: 'length',
    group: 'more',
    describes: "the room's origin to the piece's origin, towards the viewer",
  },
  {
    key: 'at.turnDeg',
    label: 'Turn',
    kind: 'angle',
    group: 'more',
    describes: 'about the vertical, anticlockwise from above',
  },
];

/**
 * Every dimension and choice of a piece that can be edited, with its limits and present value.
 *
 * @param piece - the piece
 * @returns parameters in the order of the form; lengths in millimetres, angles in degrees
 */
export function parametersOf(piece: Piece): Parameter[] {
  return specsOf(piece)
    .filter((spec) => spec.applies?.(piece) ?? true)
    .map((spec) => parameter(piece, spec));
}

/**
 * Sets one parameter of one piece; a locked piece takes none. A piece with one end at a wall grows away from it. Whoever sat at a place that is gone afterwards no longer sits.
 *
 * @param document - the set
 * @param pieceId - the piece to change
 * @param key - a key of `parametersOf`
 * @param value - in the parameter's unit; a string for a choice
 * @returns the new set, or an error with the limits that were passed
 */
export function setParameter(
  document: SetDocument,
  pieceId: string,
  key: string,
  value: number | string,
): Result<SetDocument, ParameterError> {
  const piece = document.pieces.find((one) => one.id === pieceId);
  const spec = piece && specsOf(piece).find((one) => one.key === key && (one.applies?.(piece) ?? true));
  if (piece === undefined || spec === undefined) {
    const message =
      piece === undefined
        ? 'This piece is no longer in the set.'
        : `${piece.mark} has no dimension “${key}”.`;
    return fail({ key, label: key, value, min: 0, max: 0, message });
  }
  const now = parameter(piece, spec);
  const refused = refusal(now, value);
  if (refused !== undefined) {
    return fail({ key, label: now.label, value, min: now.min, max: now.max, message: refused });
  }
  if (piece.locked) {
    const message = `${piece.mark} is locked; unlock it to change it.`;
    return fail({ key, label: now.label, value, min: now.min, max: now.max, message });
  }
  const exact = typeof value === 'number' ? Math.min(now.max, Math.max(now.min, value)) : value;
  const changed = spec.write === undefined ? withPath(piece, key, exact) : spec.write(piece, exact);
  const parsed = pieceSchema.safeParse(changed);
  if (!parsed.success) {
    const message = `${now.label}: ${value} does not go with the rest of ${piece.mark}.`;
    return fail({ key, label: now.label, value, min: now.min, max: now.max, message });
  }
  const kept = key === 'lengthMm' ? withWallEndKept(document, piece, parsed.data) : parsed.data;
  const pieces = document.pieces.map((one) => (one.id === pieceId ? kept : one));
  return ok(withoutLostSeats({ ...document, pieces }));
}

function specsOf(piece: Piece): readonly ParameterSpec<PieceKind>[] {
  // A piece only ever meets the specs of its own kind.
  const own = definitionOf(piece.kind).parameters;
  return [...own, ...POSITION];
}

function parameter(piece: Piece, spec: ParameterSpec<PieceKind>): Parameter {
  const stored = schemaLimits(piece.kind, spec.key);
  const own = spec.limits?.(piece) ?? {};
  const value = spec.read === undefined ? readPath(piece, spec.key) : spec.read(piece);
  return {
    key: spec.key,
    label: spec.label,
    kind: spec.kind,
    unit: spec.unit ?? (spec.kind === 'length' ? 'mm' : spec.kind === 'angle' ? 'deg' : ''),
    min: spec.kind === 'choice' ? 0 : Math.max(own.min ?? -Infinity, stored?.min ?? -Infinity),
    max: spec.kind === 'choice' ? 0 : Math.min(own.max ?? Infinity, stored?.max ?? Infinity),
    ...(spec.choices === undefined ? {} : { choices: spec.choices }),
    value,
    group: spec.group,
    describes: spec.describes,
  };
}

function refusal(now: Parameter, value: number | string): string | undefined {
  if (now.kind === 'choice') {
    const words = (now.choices ?? []).map((choice) => choice.label).join(', ');
    const known = now.choices?.some((choice) => choice.value === value) ?? false;
    return known ? undefined : `${now.label} can be: ${words}. “${value}” was read.`;
  }
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    return `${now.label} must be a number; “${value}” was read.`;
  }
  const unit = now.unit === '' ? '' : now.unit === 'deg' ? '°' : ` ${now.unit}`;
  const shown = (n: number) => `${Math.round(n * 10) / 10}${unit}`;
  if (now.kind === 'count' && !Number.isInteger(value) && now.unit === '') {
    return `${now.label} must be a whole number; ${value} was read.`;
  }
  // A limit that was shown rounded may be typed back.
  if (value < now.min - 0.05) return `${now.label} is at least ${shown(now.min)}; ${shown(value)} was read.`;
  if (value > now.max + 0.05) return `${now.label} is at most ${shown(now.max)}; ${shown(value)} was read.`;
  return undefined;
}

function readPath(piece: Piece, path: string): number | string {
  let value: unknown = piece;
  for (const key of path.split('.')) value = (value as Record<string, unknown>)[key];
  return value as number | string;
}

const limitsByPath = new Map<string, { min: number; max: number } | undefined>();

/** Limits the document schema sets at a path; undefined for a derived dimension. */
function schemaLimits(kind: PieceKind, path: string): { min: number; max: number } | undefined {
  const id = `${kind} ${path}`;
  if (!limitsByPath.has(id)) limitsByPath.set(id, findLimits(kind, path));
  return limitsByPath.get(id);
}

function findLimits(kind: PieceKind, path: string): { min: number; max: number } | undefined {
  let schema: z.core.$ZodType | undefined = pieceSchema.options.find(
    (option) => option.shape.kind.value === kind,
  );
  for (const key of path.split('.')) {
    schema = (schema as { shape?: Record<string, z.core.$ZodType> } | undefined)?.shape?.[key];
  }
  const number = schema as { minValue?: number | null; maxValue?: number | null } | undefined;
  if (typeof number?.minValue !== 'number' || typeof number.maxValue !== 'number') return undefined;
  return { min: number.minValue, max: number.maxValue };
}
