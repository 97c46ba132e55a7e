import { builtInPopulations, readSurvey, type Population, type Survey } from '@settlewright/anthropometry';
import { readSeedData } from '../common/seed-data';

interface BuiltIn {
  soldiers: Survey;
  populations: ReadonlyMap<string, Population>;
}

let read: BuiltIn | undefined;

function builtIn(): BuiltIn {
  read ??= readBuiltIn();
  return read;
}

function readBuiltIn(): BuiltIn {
  const ansur2 = readSeedData('populations/ansur2');
  const populations = builtInPopulations({
    ansur2,
    civilian: readSeedData('populations/civilian-2015'),
    nations: readSeedData('populations/nations'),
    children: readSeedData('populations/children'),
  });
  return { soldiers: readSurvey(ansur2), populations };
}

/** The survey that bounds what is taken for a body, and from which missing measures are estimated. */
export const referenceSurvey = (): Survey => builtIn().soldiers;

export const builtInPopulation = (id: string): Population | undefined => builtIn().populations.get(id);

export const builtInIds = (): string[] => [...builtIn().populations.keys()];
