import {
  childrenOfMark,
  civilians2015,
  nationalPopulations,
  readChildren,
  readSurvey,
  soldiers2012,
  type Survey,
} from '@settlewright/anthropometry';
import { readSeedData } from '../common/seed-data';
import type { Crowd } from './crowd';

interface BuiltIn {
  soldiers: Survey;
  crowds: ReadonlyMap<string, Crowd>;
}

let read: BuiltIn | undefined;

function builtIn(): BuiltIn {
  read ??= readBuiltIn();
  return read;
}

function readBuiltIn(): BuiltIn {
  const summary = readSeedData('populations/ansur2');
  const soldiers = readSurvey(summary);
  const children = readChildren(readSeedData('populations/children'));
  const crowds: Crowd[] = [
    { population: soldiers2012(soldiers), surveyed: countedIn(summary as Summary) },
    { population: civilians2015(readSeedData('populations/civilian-2015')) },
    ...nationalPopulations(readSeedData('populations/nations'), soldiers).map((population) => ({
      population,
    })),
    ...children.marks.map(({ mark }) => ({ population: childrenOfMark(children, mark) })),
  ];
  return { soldiers, crowds: new Map(crowds.map((crowd) => [crowd.population.id, crowd])) };
}

interface Summary {
  log: { women: { n: number }; men: { n: number } };
}

const countedIn = ({ log }: Summary) => ({ women: log.women.n, men: log.men.n });

/** The survey that bounds what is taken for a body, and from which missing measures are estimated. */
export const referenceSurvey = (): Survey => builtIn().soldiers;

export const builtInCrowd = (id: string): Crowd | undefined => builtIn().crowds.get(id);

export const builtInIds = (): string[] => [...builtIn().crowds.keys()];
