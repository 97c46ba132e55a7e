import type { KnownPerson } from '../people/person.ts';
import type { Children, ChildSizeMark } from './children-file.ts';
import { weightAt } from './children.ts';

const EVERYDAY_SHOE_MM = 25;

/**
 * The middle child of a size mark: height and lower leg at the middle of the printed ranges, the weight that children of
 * that height have.
 *
 * @param children - from `readChildren`
 * @param mark - one of its marks
 * @returns an exact person of whom nothing else is known
 * @source EN 1729-1 size marks (middles of the printed ranges); weight after NHANES 2015-2016
 */
export function middleChild(children: Children, mark: ChildSizeMark): KnownPerson {
  const middle = ([low, high]: readonly [number, number]): number => (low + high) / 2;
  const stature = middle(mark.statureMm);
  const { girls, boys } = children.growth;
  const weights = [girls, boys].map((years) => Math.exp(weightAt(years, stature).ln));
  return {
    bodyData: 'mixed',
    stature: { mm: stature, source: 'measured' },
    weightKg: ((weights[0] as number) + (weights[1] as number)) / 2,
    measured: { popliteal_height: middle(mark.poplitealWithShoesMm) - children.shoeWithinMm },
    shoeMm: EVERYDAY_SHOE_MM,
    clothing: 'light',
    exact: true,
    child: true,
  };
}
