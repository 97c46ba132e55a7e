import { z } from 'zod';

const range = z.tuple([z.number().positive(), z.number().positive()]);
const year = z.tuple([
  z.number(),
  z.number(),
  z.number().positive(),
  z.number().positive(),
  z.number().positive(),
  z.number().positive(),
]);
const schema = z.object({
  warning: z.string().min(1),
  shoe_within_mm: z.number().nonnegative(),
  marks: z
    .array(
      z.object({
        mark: z.number().int().positive(),
        stature_mm: range,
        popliteal_with_shoes_mm: range,
        seat_height_mm: z.number().positive(),
        table_height_mm: z.number().positive(),
      }),
    )
    .min(1),
  growth: z.object({ boys: z.array(year).min(1), girls: z.array(year).min(1) }),
});

/** A size of school furniture, and the children it is for. */
export interface ChildSizeMark {
  mark: number;
  /** Least and greatest stature. */
  statureMm: readonly [number, number];
  /** Least and greatest popliteal height, with shoes on. */
  poplitealWithShoesMm: readonly [number, number];
  seatHeightMm: number;
  tableHeightMm: number;
}

/** Children of one age and sex. */
export interface ChildYear {
  age: number;
  statureMm: { mean: number; sd: number };
  weightKg: { mean: number; sd: number };
}

/** What is known of children. */
export interface Children {
  /** Stands beside whatever is said of a child. */
  warning: string;
  /** Shoe that the popliteal ranges hold. */
  shoeWithinMm: number;
  marks: readonly ChildSizeMark[];
  growth: Readonly<Record<'boys' | 'girls', readonly ChildYear[]>>;
}

/**
 * Reads what is known of children.
 *
 * @param file - parsed `seed-data/populations/children.json`
 * @throws Error naming the field that does not hold together
 */
export function readChildren(file: unknown): Children {
  const parsed = schema.safeParse(file);
  if (!parsed.success) {
    const [issue] = parsed.error.issues;
    throw new Error(`Children: ${issue?.path.join('.')}: ${issue?.message}`);
  }
  const { warning, shoe_within_mm, marks, growth } = parsed.data;
  const yearOf = ([age, , mm, mmSd, kg, kgSd]: z.infer<typeof year>): ChildYear => ({
    age,
    statureMm: { mean: mm, sd: mmSd },
    weightKg: { mean: kg, sd: kgSd },
  });
  return {
    warning,
    shoeWithinMm: shoe_within_mm,
    marks: marks.map((mark) => ({
      mark: mark.mark,
      statureMm: mark.stature_mm,
      poplitealWithShoesMm: mark.popliteal_with_shoes_mm,
      seatHeightMm: mark.seat_height_mm,
      tableHeightMm: mark.table_height_mm,
    })),
    growth: { boys: growth.boys.map(yearOf), girls: growth.girls.map(yearOf) },
  };
}

/**
 * The size marks that a child may have; marks overlap, so up to two or three apply.
 *
 * @param children - from `readChildren`
 * @param statureMm - standing height without shoes
 * @returns smallest first; none where no mark reaches
 * @throws RangeError when the stature is not above 0
 * @source EN 1729-1 as school-furniture guides print it
 */
export function childSizeMarks(children: Children, statureMm: number): ChildSizeMark[] {
  if (!(statureMm > 0)) throw new RangeError(`statureMm is ${statureMm}; accepted: a number above 0`);
  return children.marks.filter(({ statureMm: [low, high] }) => statureMm >= low && statureMm <= high);
}
