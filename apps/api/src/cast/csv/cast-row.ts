import type { BodyData, Clothing, TapeMeasureKey } from '@settlewright/anthropometry';
import { isStorableText } from '../../common/text-field';
import { DAY_WORDS, isPastDay } from '../day';
import type { StatureSource, TapeMeasures } from '../entities/cast-member.entity';
import {
  acceptedWords,
  AGE_LIMIT,
  type Limit,
  NAME_MAX,
  NOTES_MAX,
  ROLE_MAX,
  SHOE_LIMIT,
  STATURE_LIMIT,
  TAKEN_BY_MAX,
  TAPE_LIMITS,
  WEIGHT_LIMIT,
  within,
} from '../limits';
import { type Column, type ColumnUnit, isLengthColumn, type LengthColumn, type TextColumn } from './columns';
import { readLength, readMass } from './read-number';

export interface CellProblem {
  /** Header of the column. */
  column: string;
  read: string;
  accepted: string;
  message: string;
}

/** What a good row says of a person. */
export interface CastRow {
  name: string;
  role: string;
  bodyData: BodyData;
  statureMm?: number;
  statureSource: StatureSource;
  weightKg?: number;
  age?: number;
  measured: TapeMeasures;
  shoeMm?: number;
  clothing: Clothing;
  notes: string;
}

export interface FileSetting {
  bareLength: ColumnUnit;
  bareMass: ColumnUnit;
  decimalComma: boolean;
}

const BODY_WORDS: Record<string, BodyData> = {
  women: 'women',
  woman: 'women',
  female: 'women',
  f: 'women',
  w: 'women',
  men: 'men',
  man: 'men',
  male: 'men',
  m: 'men',
  mixed: 'mixed',
  unknown: 'mixed',
  other: 'mixed',
  x: 'mixed',
};
const SOURCE_WORDS: Record<string, StatureSource> = {
  measured: 'measured',
  taken: 'measured',
  told: 'told',
  said: 'told',
};
const CLOTHING_WORDS: Record<string, Clothing> = { light: 'light', medium: 'medium', heavy: 'heavy' };

const LINES_IN: ReadonlySet<TextColumn> = new Set<TextColumn>(['notes']);
const LONGEST: Partial<Record<TextColumn, number>> = {
  name: NAME_MAX,
  role: ROLE_MAX,
  notes: NOTES_MAX,
  taken_by: TAKEN_BY_MAX,
};

const limitOf = (key: LengthColumn): Limit =>
  key === 'stature' ? STATURE_LIMIT : key === 'shoe' ? SHOE_LIMIT : TAPE_LIMITS[key];

/** Reads one row; every cell that cannot be used is named, not only the first. */
export function readCastRow(
  cells: readonly string[],
  columns: readonly Column[],
  setting: FileSetting,
): { value: CastRow; problems: [] } | { value?: undefined; problems: CellProblem[] } {
  const reader = new RowReader(cells, columns, setting);
  const name = reader.text('name');
  if (name === '' && !reader.has('name')) reader.refuse('name', '', 'a name', 'the row has no name');
  const takenBy = reader.text('taken_by');
  const takenOn = reader.day('taken_on');
  const statureMm = reader.length('stature');
  const weightKg = reader.mass();
  const age = reader.years();
  const shoeMm = reader.length('shoe');
  const value: CastRow = {
    name,
    role: reader.text('role'),
    bodyData: reader.word('body_data', BODY_WORDS, 'women, men or mixed') ?? 'mixed',
    ...(statureMm === undefined ? {} : { statureMm }),
    statureSource: reader.word('stature_source', SOURCE_WORDS, 'measured or told') ?? 'told',
    ...(weightKg === undefined ? {} : { weightKg }),
    ...(age === undefined ? {} : { age }),
    measured: reader.measured({ ...(takenBy ? { takenBy } : {}), ...(takenOn ? { takenOn } : {}) }),
    ...(shoeMm === undefined ? {} : { shoeMm }),
    clothing: reader.word('clothing', CLOTHING_WORDS, 'light, medium or heavy') ?? 'light',
    notes: reader.text('notes'),
  };
  return reader.problems.length > 0 ? { problems: reader.problems } : { value, problems: [] };
}

class RowReader {
  readonly problems: CellProblem[] = [];

  constructor(
    private readonly cells: readonly string[],
    private readonly columns: readonly Column[],
    private readonly setting: FileSetting,
  ) {}

  has(key: Column['key']): boolean {
    return this.raw(key) !== '';
  }

  text(key: TextColumn): string {
    const raw = this.raw(key);
    const longest = LONGEST[key] ?? 0;
    if (raw.length > longest) {
      this.refuse(key, raw, `up to ${longest} characters`, `this has ${raw.length} characters`);
    } else if (!isStorableText(raw, LINES_IN.has(key))) {
      this.refuse(key, raw, 'one line of plain text', 'this holds control characters or line breaks');
    } else return raw;
    return '';
  }

  word<T extends string>(key: TextColumn, words: Record<string, T>, accepted: string): T | undefined {
    const raw = this.raw(key);
    if (raw === '') return undefined;
    const said = raw.toLowerCase();
    if (Object.hasOwn(words, said)) return words[said];
    this.refuse(key, raw, accepted, 'this word is not known here');
    return undefined;
  }

  day(key: TextColumn): string | undefined {
    const raw = this.raw(key);
    if (raw === '' || isPastDay(raw)) return raw || undefined;
    this.refuse(key, raw, DAY_WORDS, 'this is not such a day');
    return undefined;
  }

  length(key: LengthColumn): number | undefined {
    const raw = this.raw(key);
    if (raw === '') return undefined;
    const bare = this.column(key)?.unit ?? this.setting.bareLength;
    const read = readLength(raw, { bare, decimalComma: this.setting.decimalComma });
    return this.checked(key, raw, read, limitOf(key));
  }

  mass(): number | undefined {
    const raw = this.raw('weight');
    if (raw === '') return undefined;
    const bare = this.column('weight')?.unit ?? this.setting.bareMass;
    const read = readMass(raw, { bare, decimalComma: this.setting.decimalComma });
    return this.checked('weight', raw, read, WEIGHT_LIMIT);
  }

  years(): number | undefined {
    const raw = this.raw('age');
    if (raw === '') return undefined;
    const years = /^\d{1,3}$/.test(raw) ? Number(raw) : NaN;
    if (within(AGE_LIMIT, years)) return years;
    this.refuse('age', raw, `whole years, ${acceptedWords(AGE_LIMIT)}`, 'this is not such an age');
    return undefined;
  }

  measured(taken: { takenBy?: string; takenOn?: string }): TapeMeasures {
    const keys = this.columns.map(({ key }) => key).filter(isLengthColumn);
    const measures: TapeMeasures = {};
    for (const key of keys.filter(
      (other): other is TapeMeasureKey => other !== 'stature' && other !== 'shoe',
    )) {
      const mm = this.length(key);
      if (mm !== undefined) measures[key] = { mm, ...taken };
    }
    return measures;
  }

  refuse(key: Column['key'], raw: string, accepted: string, why: string): void {
    const column = this.column(key)?.header ?? key;
    const read = raw.slice(0, 80);
    this.problems.push({
      column,
      read,
      accepted,
      message: `${column}: read "${read}"; ${why}; accepted: ${accepted}`,
    });
  }

  private checked(
    key: Column['key'],
    raw: string,
    read: ReturnType<typeof readLength>,
    limit: Limit,
  ): number | undefined {
    if (!read.ok) this.refuse(key, raw, read.accepted, read.why);
    else if (!within(limit, read.value)) {
      const shown = Math.round(read.value * 10) / 10;
      this.refuse(key, raw, acceptedWords(limit), `that is ${shown} ${limit.unit}`);
    } else return read.value;
    return undefined;
  }

  private column(key: Column['key']): Column | undefined {
    return this.columns.find((column) => column.key === key);
  }

  private raw(key: Column['key']): string {
    const column = this.column(key);
    return column ? (this.cells[column.index] ?? '').trim() : '';
  }
}
