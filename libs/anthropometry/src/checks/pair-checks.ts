import { best, fixed, moved, ofBody, type Amount } from './amount.ts';
import { nothing, plainQuestion, type PieceAnswer, type PieceAsked, type PieceCheck } from './piece-check.ts';
import { ledgerOf, question, type Entry } from './question.ts';
import { ruleNumber } from './rule-book.ts';
import type { CornerSituation } from './situation.ts';
import type { Question } from './verdict.ts';

/** How far somebody's knees stand out before the seat: the sitter's, or the public's where nobody sits. */
function kneesOut(asked: PieceAsked, placeId: string, effectiveDepthMm: number): Entry {
  const seated = asked.seated.get(placeId);
  const { publicRead } = asked.rule;
  if (seated) {
    return [
      `${seated.name}’s knees before the seat`,
      moved(ofBody(seated.body, 'buttock_knee_length'), -effectiveDepthMm),
    ];
  }
  const {
    bodyData = 'men',
    measure = 'buttock_knee_length',
    percentile = 95,
    readAs = '',
  } = publicRead ?? {};
  const length = asked.model.percentile(bodyData, measure, percentile);
  return [`${readAs}’s knees before the seat`, fixed(length - effectiveDepthMm)];
}

/**
 * Knees facing: gap between the fronts of facing benches, for the two that sit opposite each other.
 *
 * @source rule SIDE-04
 */
export const kneesFacing: PieceCheck = {
  id: 'SIDE-04',
  ask(asked) {
    const { facing } = asked.situation;
    if (facing.length === 0) return nothing('no facing benches');
    return facing.flatMap(({ pieceIds, marks, gapMm, pairs }): PieceAnswer[] => {
      const asPair = (said: PieceAnswer['said'], part?: string): PieceAnswer => ({
        pieceIds,
        marks,
        ...(part ? { part } : {}),
        said,
      });
      if (pairs.length === 0) return [asPair({ kind: 'doesNotApply', reason: 'nobody sits opposite' })];
      const ofNobody = pairs.filter((pair) => pair.some((id) => asked.seated.get(id)?.noBody));
      const known = pairs.filter((pair) => !ofNobody.includes(pair));
      const closest = (some: typeof pairs) =>
        some.map((pair) => facingQuestion(asked, pair, gapMm)).reduce((a, b) => (room(b) < room(a) ? b : a));
      // A pair that is not known neither hides the closest of the others nor hides behind it.
      return [
        ...(known.length > 0 ? [asPair(closest(known))] : []),
        ...(ofNobody.length > 0 ? [asPair(closest(ofNobody), NOT_KNOWN_PAIRS)] : []),
      ];
    });
  },
};

/** Tells the answer about places that nobody is behind from the one about the others. */
const NOT_KNOWN_PAIRS = 'nobody';

/** Room to the pass line, to find the pair of sitters that is closest. */
const room = ({ value, pass }: Question): number => best(value) - best(pass.lower ?? fixed(0));

function facingQuestion(asked: PieceAsked, pair: readonly [string, string], gapMm: number): Question {
  const by = ruleNumber(asked.rule, 'allowance');
  const knees = pair.map((id) => kneesOut(asked, id, asked.places.get(id)?.effectiveDepthMm ?? 0));
  const longest = knees.reduce((a, b) => (best(b[1]) > best(a[1]) ? b : a));
  const between: Entry = ['room to move', fixed(by)];
  return question({
    value: fixed(gapMm),
    setLedger: () => ledgerOf([['seat front to seat front', fixed(gapMm)]], 'gap'),
    lower: { pass: [...knees, between], fail: [longest, between] },
  });
}

/**
 * First place at a corner: its centre from the other leg's front edge, against the knees of whoever sits there.
 *
 * @source rule SIDE-05
 */
export const cornerPlace: PieceCheck = {
  id: 'SIDE-05',
  ask(asked) {
    const { corners } = asked.situation;
    if (corners.length === 0) return nothing('no inside corner');
    return corners.map((corner) => {
      const { pieceIds, marks, widthMm, centreFromFrontMm, placeId } = corner;
      const half: Amount = fixed(widthMm / 2);
      const neighbour = neighbourOf(corner, corners)?.placeId ?? '';
      const knees = kneesOut(asked, neighbour, corner.effectiveDepthMm);
      // Knees that end behind the seat front ask for nothing; those of nobody may be anywhere.
      const asks = best(knees[1]) > 0 || asked.seated.get(neighbour)?.noBody;
      const pass: Entry[] = asks ? [['half the place', half], knees] : [['half the place', half]];
      return {
        pieceIds,
        marks,
        part: placeId,
        said: plainQuestion('centre of the place from the other front', centreFromFrontMm, {
          lower: { pass, fail: [['half the place', half]] },
        }),
      };
    });
  },
};

/** The place on the other leg of the same corner. */
const neighbourOf = (corner: CornerSituation, corners: readonly CornerSituation[]) =>
  corners.find(
    (other) => other.placeId !== corner.placeId && corner.pieceIds.every((id) => other.pieceIds.includes(id)),
  );
