import { GROUPS } from './counts.ts';
import type { Demands, GroupStudies } from './demands.ts';

const FNV_START = 0x811c9dc5;
const FNV_PRIME = 0x01000193;

/**
 * A short name of what is asked: FNV-1a over the demands of both sexes.
 *
 * @param studies - people and questions by sex
 * @param checks - each ticked rule at all ticked places
 * @returns eight hexadecimal digits
 */
export function questionOf(
  studies: GroupStudies,
  checks: readonly { ruleId: string; demands: Demands }[],
): string {
  const words = [
    ...checks.flatMap(({ ruleId, demands }) => [ruleId, demands.women.fits.key, demands.men.fits.key]),
    ...GROUPS.flatMap((group) =>
      studies[group].places.flatMap((place) => place.checks.map((check) => check.atLeastTight.key)),
    ),
  ].join('\n');
  let hash = FNV_START;
  for (let i = 0; i < words.length; i += 1) hash = Math.imul(hash ^ words.charCodeAt(i), FNV_PRIME);
  return (hash >>> 0).toString(16).padStart(8, '0');
}
