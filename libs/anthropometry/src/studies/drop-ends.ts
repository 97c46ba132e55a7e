import { UNCALIBRATED } from '../checks/sink-band.ts';
import type { PlaceSituation } from '../checks/situation.ts';
import type { DropEnd } from './counts.ts';

/**
 * Places whose cushions go down least, or most, within the 90 % range of the estimate or of test sits. The error of a
 * seat is one and the same for everybody who sits on it, so it is no draw for each person; the seats of a set are taken
 * to one end together.
 *
 * @param places - of a set
 * @param end - least or most
 * @returns the places in their order; those on a hard seat as they are
 * @source range as in `sinkBand`
 */
export function placesAtDrop(places: readonly PlaceSituation[], end: DropEnd): PlaceSituation[] {
  return places.map((place) => {
    if (!place.foam) return place;
    const { factor, error, sits } = place.foam.tested ?? UNCALIBRATED;
    const times = end === 'least' ? 1 - error : 1 + error;
    return { ...place, foam: { ...place.foam, tested: { factor: factor * times, error, sits } } };
  });
}
