import type { SurveyGroup } from '../populations/survey.ts';
import { isLogged } from '../populations/worked.ts';
import type { GroupModel, Posterior } from './group-model.ts';

/** Moments in millimetres (kilograms for weight) of a person's measures, by their place in the group's matrix. */
export interface BodyMoments {
  mean(i: number): number;
  covariance(i: number, j: number): number;
  /** Third central moment of three measures together. */
  third(i: number, j: number, k: number): number;
}

/** One group's belief with its share. */
export interface WeightedPosterior {
  weight: number;
  name: SurveyGroup;
  group: GroupModel;
  posterior: Posterior;
  /** Millimetres that age adds, by place in the group's matrix. */
  shift: ReadonlyMap<number, number>;
  moments: BodyMoments;
}

/**
 * Exact moments of the measures of which a worked normal is believed.
 *
 * @param group - whose matrix the places are in
 * @param posterior - worked normal of one person
 * @param shift - millimetres added to some measures, by place
 * @returns moments, each worked out when it is first asked for
 * @source lognormal: E[x y] = E[x] E[y] exp(c), and its third moment alike; with a plain normal Stein's lemma
 */
export function momentsOfBody(
  group: GroupModel,
  { mean, covariance, scale, taken }: Posterior,
  shift: ReadonlyMap<number, number>,
): BodyMoments {
  const { size } = group;
  const logged = group.keys.map(isLogged);
  const worked = (i: number, j: number): number => {
    const c = covariance[i * size + j] as number;
    return scale ? c * (scale[i] as number) * (scale[j] as number) : c;
  };
  /** Covariance as a share of both levels. */
  const shares = new Float64Array(size * size).fill(Number.NaN);
  const shareOf = (i: number, j: number): number => {
    const at = i <= j ? i * size + j : j * size + i;
    const kept = shares[at] as number;
    if (!Number.isNaN(kept)) return kept;
    const c = worked(i, j);
    const share = logged[i] && logged[j] ? Math.expm1(c) : c;
    shares[at] = share;
    return share;
  };
  /** Mean of a logged measure; 1 for a plain one, whose covariances are not shares. */
  const levels = new Float64Array(size).fill(Number.NaN);
  const levelOf = (i: number): number => {
    const kept = levels[i] as number;
    if (!Number.isNaN(kept)) return kept;
    const level = logged[i] ? (taken.get(i) ?? Math.exp((mean[i] as number) + worked(i, i) / 2)) : 1;
    levels[i] = level;
    return level;
  };

  return {
    mean: (i) => (logged[i] ? levelOf(i) : (mean[i] as number)) + (shift.get(i) ?? 0),
    covariance: (i, j) => {
      const share = shareOf(i, j);
      return share === 0 ? 0 : levelOf(i) * levelOf(j) * share;
    },
    third(i, j, k) {
      const [a, b, c] = [shareOf(i, j), shareOf(i, k), shareOf(j, k)];
      const level = levelOf(i) * levelOf(j) * levelOf(k);
      const [li, lj, lk] = [logged[i], logged[j], logged[k]];
      if (li && lj && lk) return level * (a * b + a * c + b * c + a * b * c);
      if (lj && lk) return level * (a + b) * c;
      if (li && lk) return level * (a + c) * b;
      if (li && lj) return level * (b + c) * a;
      if (li) return level * a * b;
      if (lj) return level * a * c;
      return lk ? level * b * c : 0;
    },
  };
}
