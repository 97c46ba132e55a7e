import { readChildren } from './children-file.ts';
import { childrenOfMark } from './children.ts';
import { civilians2015 } from './civilian.ts';
import { nationalPopulations } from './nations.ts';
import type { Population } from './population.ts';
import { soldiers2012 } from './survey-population.ts';
import { readSurvey } from './survey.ts';

/** Parsed files of `seed-data/populations` that the populations are made of. */
export interface PopulationFiles {
  /** `ansur2.json` */
  ansur2: unknown;
  /** `civilian-2015.json` */
  civilian: unknown;
  /** `nations.json` */
  nations: unknown;
  /** `children.json` */
  children: unknown;
}

/**
 * Every population that ships with the product, by its id.
 *
 * @param files - parsed files
 * @returns soldiers, civilians, national groups and size marks of children
 * @throws Error naming the field of a file that does not hold together
 */
export function builtInPopulations(files: PopulationFiles): ReadonlyMap<string, Population> {
  const survey = readSurvey(files.ansur2);
  const children = readChildren(files.children);
  const populations = [
    soldiers2012(survey),
    civilians2015(files.civilian),
    ...nationalPopulations(files.nations, survey),
    ...children.marks.map(({ mark }) => childrenOfMark(children, mark)),
  ];
  return new Map(populations.map((population) => [population.id, population]));
}
