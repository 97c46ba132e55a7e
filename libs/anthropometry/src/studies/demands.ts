import { together, type CompiledCheck, type CompiledPlace } from './compile.ts';
import type { Group } from './counts.ts';
import type { Crowd } from './crowd.ts';
import type { PeopleSets } from './people-sets.ts';

/** People of one sex and what is asked of them. */
export interface GroupStudy {
  crowd: Crowd;
  sets: PeopleSets;
  places: readonly CompiledPlace[];
}

export type GroupStudies = Record<Group, GroupStudy>;

/** What counts for "all at once". */
export interface Ticks {
  rule: (ruleId: string) => boolean;
  place: (placeId: string) => boolean;
}

/** What is asked of each sex. */
export type Demands = Record<Group, Pick<CompiledCheck, 'fits' | 'atLeastTight'>>;

/** What each ticked rule says at ticked places, where it says something. */
export function byRule({ places }: GroupStudy, ticks: Ticks): Map<string, CompiledCheck[]> {
  const rules = new Map<string, CompiledCheck[]>();
  for (const { placeId, checks } of places) {
    if (!ticks.place(placeId)) continue;
    for (const check of checks) {
      if (check.silent !== undefined || !ticks.rule(check.ruleId)) continue;
      const list = rules.get(check.ruleId);
      if (list) list.push(check);
      else rules.set(check.ruleId, [check]);
    }
  }
  return rules;
}

/** Everything ticked as one demand on each sex; nothing where no ticked rule speaks, for that asks nothing. */
export function joined(studies: GroupStudies, ticks: Ticks): Demands | undefined {
  if (byRule(studies.women, ticks).size === 0) return undefined;
  return bothSexes(studies, (group) => demandOf([...byRule(studies[group], ticks).values()].flat()));
}

/** Why no ticked rule speaks: the one reason of them all, or that there are several. */
export function silenceOf({ places }: GroupStudy, ticks: Ticks): string {
  const reasons = new Set(
    places
      .filter(({ placeId }) => ticks.place(placeId))
      .flatMap(({ checks }) => checks.filter(({ ruleId }) => ticks.rule(ruleId)))
      .map(({ silent }) => silent),
  );
  const [only, other] = reasons;
  return only !== undefined && other === undefined ? only : 'none of these checks has anything to say';
}

export const demandOf = (checks: readonly CompiledCheck[]): Demands[Group] => ({
  fits: together(checks.map(({ fits }) => fits)),
  atLeastTight: together(checks.map(({ atLeastTight }) => atLeastTight)),
});

/** Asks once where both sexes wear the same. */
export function bothSexes(studies: GroupStudies, ask: (group: Group) => Demands[Group]): Demands {
  const women = ask('women');
  return { women, men: studies.men.places === studies.women.places ? women : ask('men') };
}
