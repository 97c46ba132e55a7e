import { MEASURE_INFO, TAPE_MEASURE_KEYS, type TapeMeasureKey } from '@settlewright/anthropometry';

export type TextColumn =
  'name' | 'role' | 'body_data' | 'stature_source' | 'age' | 'clothing' | 'notes' | 'taken_by' | 'taken_on';
export type LengthColumn = 'stature' | 'shoe' | TapeMeasureKey;
export type ColumnKey = TextColumn | LengthColumn | 'weight';

export type ColumnUnit = 'mm' | 'cm' | 'm' | 'in' | 'ft' | 'kg' | 'lb';

export interface Column {
  index: number;
  /** As the file says it. */
  header: string;
  key: ColumnKey;
  /** Unit named in the header. */
  unit?: ColumnUnit;
}

export interface ReadColumns {
  columns: Column[];
  ignored: string[];
  /** Headers that stand for the same thing. */
  repeated: { key: ColumnKey; headers: string[] }[];
}

const UNITS: Record<string, ColumnUnit> = {
  mm: 'mm',
  cm: 'cm',
  m: 'm',
  in: 'in',
  inch: 'in',
  inches: 'in',
  ft: 'ft',
  feet: 'ft',
  kg: 'kg',
  lb: 'lb',
  lbs: 'lb',
  pounds: 'lb',
};

/** What people call the columns, besides the names of the measures themselves. */
const PLAIN_WORDS: Record<ColumnKey, string[]> = {
  name: ['person', 'actor', 'sitter', 'cast member', 'full name', 'cast'],
  role: ['part', 'character', 'playing'],
  body_data: ['body', 'sex', 'gender', 'group'],
  stature: ['height', 'standing height', 'body height', 'tall'],
  stature_source: ['height source', 'source', 'measured or told'],
  weight: ['weight kg', 'mass', 'body weight'],
  age: ['years', 'years old'],
  shoe: ['shoes', 'shoe height', 'heel', 'heel height'],
  clothing: ['clothes', 'costume'],
  notes: ['note', 'remarks', 'comment'],
  taken_by: ['measured by'],
  taken_on: ['measured on', 'date', 'date measured'],
  sitting_height: ['seated height'],
  eye_height_sitting: ['eye height', 'seated eye height'],
  acromial_height_sitting: ['shoulder height', 'seated shoulder height'],
  elbow_rest_height: ['elbow height', 'elbow rest'],
  popliteal_height: ['back of knee height', 'back of knee', 'lower leg', 'lower leg length'],
  knee_height_sitting: ['knee height', 'seated knee height', 'top of knee'],
  buttock_popliteal_length: ['thigh length', 'back to back of knee'],
  buttock_knee_length: ['back to knee', 'back to front of knee'],
  thigh_clearance: ['thigh height', 'thigh thickness'],
  hip_breadth_sitting: ['hips', 'hip width', 'hip breadth', 'seated hip width'],
  bideltoid_breadth: ['shoulders', 'shoulder width', 'shoulder breadth'],
  forearm_forearm_breadth: ['elbow to elbow', 'elbows', 'elbow width'],
  abdominal_extension_depth_sitting: ['belly', 'belly depth', 'abdominal depth'],
};

function plain(header: string): string {
  return header
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, '_')
    .replace(/^_+|_+$/g, '');
}

function wordsFor(key: ColumnKey): string[] {
  const own = [key, ...PLAIN_WORDS[key]];
  const measure = TAPE_MEASURE_KEYS.find((other) => other === key);
  if (!measure) return own;
  const { name, plain: said, abbreviation } = MEASURE_INFO[measure];
  return [...own, name, said, ...(abbreviation ? [abbreviation] : [])];
}

const KEY_BY_WORDS = new Map<string, ColumnKey>();
for (const key of Object.keys(PLAIN_WORDS) as ColumnKey[]) {
  for (const words of wordsFor(key)) if (!KEY_BY_WORDS.has(plain(words))) KEY_BY_WORDS.set(plain(words), key);
}

/** Finds out what each header stands for; `hip_breadth_sitting_mm`, "Hip width (in)" and "hips" are one thing. */
export function readColumns(headers: readonly string[]): ReadColumns {
  const columns: Column[] = [];
  const ignored: string[] = [];
  headers.forEach((header, index) => {
    const found = readHeader(header);
    if (found) columns.push({ index, header: header.trim(), ...found });
    else if (header.trim() !== '') ignored.push(header.trim());
  });
  const keys = [...new Set(columns.map(({ key }) => key))];
  const repeated = keys
    .map((key) => ({
      key,
      headers: columns.filter((column) => column.key === key).map(({ header }) => header),
    }))
    .filter(({ headers: same }) => same.length > 1);
  return { columns, ignored, repeated };
}

function readHeader(header: string): { key: ColumnKey; unit?: ColumnUnit } | null {
  const words = plain(header);
  const whole = KEY_BY_WORDS.get(words);
  const cut = words.lastIndexOf('_');
  const unit = cut > 0 ? UNITS[words.slice(cut + 1)] : undefined;
  const base = unit ? KEY_BY_WORDS.get(words.slice(0, cut)) : undefined;
  if (base && unit && fits(base, unit)) return { key: base, unit };
  return whole ? { key: whole } : null;
}

function fits(key: ColumnKey, unit: ColumnUnit): boolean {
  const mass = unit === 'kg' || unit === 'lb';
  return key === 'weight' ? mass : !mass && isLengthColumn(key);
}

export function isLengthColumn(key: ColumnKey): key is LengthColumn {
  return key === 'stature' || key === 'shoe' || (TAPE_MEASURE_KEYS as readonly string[]).includes(key);
}
