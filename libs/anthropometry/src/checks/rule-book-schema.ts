import { z } from 'zod';
import { MEASURE_KEYS } from '../measures/measures.ts';
import { CONFIDENCE_LIMITS } from './confidence-limits.ts';

const sourceSchema = z.object({
  cite: z.string().min(1),
  mark: z.enum(['RETRIEVED', 'FROM MEMORY', 'DERIVED', 'HOUSE RULE']),
});

const ruleSchema = z.object({
  id: z.string().regex(/^[A-Z]+-\d\d$/),
  name: z.string().min(1),
  columnName: z.string().min(1),
  group: z.string().min(1),
  scope: z.enum(['person', 'pair', 'bench', 'table', 'way', 'set']),
  unit: z.enum(['mm', 'deg', 'count']),
  tier: z.enum(['guidance', 'code']),
  why: z.string().min(1),
  sources: z.array(sourceSchema).min(1),
  thresholdBasis: z.string().min(1),
  sourceWord: z.enum(['published source', 'common practice', 'shop rule', 'from memory']),
  clause: z.string().optional(),
  publicRule: z.string().optional(),
  publicRead: z
    .object({
      readAs: z.string().min(1),
      bodyData: z.enum(['women', 'men']).optional(),
      measure: z.enum(MEASURE_KEYS).optional(),
      percentile: z.number().gt(0).lt(100).optional(),
    })
    .optional(),
  numbers: z.record(z.string(), z.number()),
  worked: z.object({
    given: z.record(z.string(), z.union([z.number(), z.string()])),
    expected: z.record(z.string(), z.union([z.number(), z.string(), z.boolean()])),
    hand: z.string().min(1),
  }),
});

const sideSchema = z.object({ rules: z.array(z.string()), purpose: z.string().min(1) });

const conflictSchema = z.object({
  id: z.string().min(1),
  when: z.string().min(1),
  sides: z.tuple([sideSchema, sideSchema]),
  note: z.string().min(1),
  numbers: z.record(z.string(), z.number()),
  sources: z.array(sourceSchema).min(1),
  atValue: z.object({ rule: z.string(), lowerMm: z.number(), upperMm: z.number() }).optional(),
});

/** The rule data as the file holds them. */
export const bookSchema = z.object({
  version: z.string().min(1),
  confidence: z.number().min(CONFIDENCE_LIMITS.lowest).max(CONFIDENCE_LIMITS.highest),
  confidenceSource: sourceSchema,
  boundaryTolerance: z.object({
    mm: z.number().nonnegative(),
    deg: z.number().nonnegative(),
    count: z.number().nonnegative(),
  }),
  standIn: z.object({ littleSaidMm: z.number().positive(), source: sourceSchema }),
  practices: z.array(
    z.object({
      id: z.string().min(1),
      words: z.string().min(1),
      lowerIn: z.number(),
      usualIn: z.number(),
      upperIn: z.number(),
      sourceWord: z.enum(['published source', 'common practice', 'shop rule', 'from memory']),
      source: z.string().min(1),
    }),
  ),
  conflicts: z.array(conflictSchema),
  rules: z.array(ruleSchema).min(1),
});
