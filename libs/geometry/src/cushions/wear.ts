import { z } from 'zod';
import { otherEdge } from './mirrored-shape.ts';
import { joined, phrase, type Phrase } from '../units/phrase.ts';

const length = (min: number, max: number) => z.number().min(min).max(max);

/** Where a cushion is to look used; left and right as the sitter sees them, `area` is a rectangle of its own. */
export const WEAR_PLACES = [
  'front-edge',
  'back-edge',
  'left-end',
  'right-end',
  'middle',
  'whole',
  'area',
] as const;
export type WearPlace = (typeof WEAR_PLACES)[number];

/** How it is to look there. */
export const WEAR_LOOKS = ['fade', 'worn-through', 'stain', 'patch', 'other'] as const;
export type WearLook = (typeof WEAR_LOOKS)[number];

/** Most marked areas of one cushion. */
export const MAX_WEAR = 12;

/** One area of a cushion that is to look used. */
export const wearAreaSchema = z
  .strictObject({
    place: z.enum(WEAR_PLACES),
    /** Rectangle in plan, of a back cushion on its face, as the sitter sees it. */
    areaMm: z
      .strictObject({
        fromEnd: z.enum(['left', 'right']),
        fromSideMm: length(0, 12000),
        fromFrontMm: length(0, 2500),
        widthMm: length(5, 12000),
        depthMm: length(5, 2500),
      })
      .optional(),
    look: z.enum(WEAR_LOOKS),
    note: z.string().trim().max(200).optional(),
  })
  .refine(({ place, areaMm }) => (place === 'area') === (areaMm !== undefined), {
    path: ['areaMm'],
    message: 'An area of its own needs its sizes, and a named place has none',
  });

export type WearArea = z.infer<typeof wearAreaSchema>;

/** Looks in the words of the sheet. */
export const WEAR_LOOK_WORDS: Record<WearLook, string> = {
  fade: 'faded',
  'worn-through': 'worn through',
  stain: 'stained',
  patch: 'patched',
  other: 'as noted',
};

/** Places in the words of the sheet; of a back cushion the front edge is the bottom one. */
export const WEAR_PLACE_WORDS: Record<'seat' | 'back', Record<WearPlace, string>> = {
  seat: {
    'front-edge': 'front edge',
    'back-edge': 'back edge',
    'left-end': 'sitter’s left end',
    'right-end': 'sitter’s right end',
    middle: 'middle',
    whole: 'all over',
    area: 'area',
  },
  back: {
    'front-edge': 'bottom edge',
    'back-edge': 'top edge',
    'left-end': 'sitter’s left end',
    'right-end': 'sitter’s right end',
    middle: 'middle',
    whole: 'all over',
    area: 'area',
  },
};

/**
 * What is said of one marked area.
 *
 * @param area - what was marked
 * @param kind - of the cushion
 */
export function wearPhrase({ place, areaMm, look, note = '' }: WearArea, kind: 'seat' | 'back'): Phrase {
  const where = areaMm
    ? phrase`${{ mm: areaMm.widthMm }} × ${{ mm: areaMm.depthMm }}, ${{ mm: areaMm.fromSideMm }} from the sitter’s ${areaMm.fromEnd} end and ${{ mm: areaMm.fromFrontMm }} from the ${WEAR_PLACE_WORDS[kind]['front-edge']}`
    : WEAR_PLACE_WORDS[kind][place];
  return joined([phrase`${where}: ${WEAR_LOOK_WORDS[look]}`, note], ', ');
}

/**
 * All marked areas of a cushion, numbered as on its plan.
 *
 * @param wear - what was marked
 * @param kind - of the cushion
 */
export const allWearPhrase = (wear: readonly WearArea[], kind: 'seat' | 'back'): Phrase =>
  joined(
    wear.map((area, i) => phrase`${wearMark(i)} ${wearPhrase(area, kind)}`),
    '; ',
  );

/**
 * The name of an area on the plan.
 *
 * @param index - of the area, from 0
 */
export const wearMark = (index: number): string => `A${index + 1}`;

const OTHER_PLACE: Partial<Record<WearPlace, WearPlace>> = {
  'left-end': 'right-end',
  'right-end': 'left-end',
};

/**
 * A marked area of the mirror image of a cushion.
 *
 * @param area - what was marked
 */
export function mirroredWear({ place, areaMm, ...rest }: WearArea): WearArea {
  return {
    ...rest,
    place: OTHER_PLACE[place] ?? place,
    ...(areaMm && {
      areaMm: { ...areaMm, fromEnd: otherEdge(areaMm.fromEnd) },
    }),
  };
}
