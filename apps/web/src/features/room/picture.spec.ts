import { createBodyModel, loadRuleBook, type FitCell, type MeasureKey } from '@settlewright/anthropometry';
import {
  addPiece,
  ARRANGEMENTS,
  choosePosture,
  emptySetDocument,
  seatSitter,
  sitterDistances,
  tapeLines,
  type SetDocument,
} from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import children from '@settlewright/seed-data/populations/children.json';
import { describe, expect, it } from 'vitest';
import type { CastMember } from '@/lib/contract.ts';
import { createPictureMaker, type ServerFitSheet } from './picture.ts';

const engine = { model: createBodyModel(summary, children), ruleBook: loadRuleBook(rules) };
const castId = '7f0c1a52-6a1e-4f0e-9d5d-0d6f5a0c7e11';
const added = addPiece(emptySetDocument(), 'bench');
const document: SetDocument = {
  ...added.document,
  seating: [{ pieceId: added.pieceId, place: 2, sitter: { kind: 'cast', castId } }],
};
const known: CastMember = {
  id: castId,
  name: 'Hetty Vance',
  role: 'signal keeper',
  colour: 3,
  bodyData: 'women',
  statureMm: 1511.3,
  statureSource: 'measured',
  weightKg: 52,
  measured: { popliteal_height: { mm: 361.95 } },
  shoeMm: 25,
  clothing: 'light',
};

/** The sheet as carpenter and reviewer receive it: verdict and margin, and a body rounded to 20 mm. */
function serverSheet(): ServerFitSheet {
  const full = createPictureMaker(engine, [known]).check(document);
  const open = (cell: FitCell): FitCell => {
    if (cell.outcome.kind !== 'verdict') return cell;
    const { kind, verdict, margin, estimated } = cell.outcome;
    return { ...cell, outcome: { kind, verdict, margin, estimated } as FitCell['outcome'] };
  };
  const means = engine.model
    .predict({ bodyData: 'women', measured: {}, shoeMm: 25, clothing: 'light' })
    .means();
  const rounded = Object.fromEntries(
    Object.entries(means)
      .filter(([key]) => key !== 'weight_kg')
      .map(([key, mm]) => [key, Math.round(mm / 20) * 20]),
  ) as Record<MeasureKey, number>;
  return {
    ...full,
    detail: 'verdicts',
    rows: full.rows.map((row) => ({ ...row, cells: row.cells.map(open) })),
    bodies: [{ placeId: `${added.pieceId}:2`, means: rounded, shoeMm: 20 }],
  };
}

describe('what follows from a document', () => {
  it('names whose measures make no body, and still checks and draws the rest', () => {
    const sheet = serverSheet();
    const bodies = sheet.bodies?.map((body) => ({
      ...body,
      means: { ...body.means, elbow_rest_height: -40 },
    }));
    const server = { ...sheet, ...(bodies ? { bodies } : {}) };
    const whole = createPictureMaker(engine, [known], { server }).picture(document);
    expect(whole.bodies).toEqual([]);
    expect(whole.undrawn).toEqual(['Hetty Vance']);
    expect(whole.sheet.rows).toHaveLength(1);
    expect(createPictureMaker(engine, [known]).picture(document).undrawn).toEqual([]);
  });

  it('draws a child for scale, with nothing in doubt to show and a row that is no pass', () => {
    const sitter = { kind: 'child', sizeMark: 2 } as const;
    const withChild = { ...document, seating: [{ pieceId: added.pieceId, place: 1, sitter }] };
    const { bodies, sheet } = createPictureMaker(engine, []).picture(withChild);
    expect(bodies).toMatchObject([{ name: 'Child, size mark 2', forScale: true, statureMm: 1145 }]);
    expect(bodies[0]?.belief).toBeUndefined();
    expect(['notKnown', 'wontFit']).toContain(sheet.rows[0]?.worst);
    const grownUp = createPictureMaker(engine, [known]).picture(document).bodies[0];
    expect(grownUp?.forScale).toBe(false);
    expect(grownUp?.belief).toBeDefined();
  });

  it('asks of a verdict the probability that the workshop asks', () => {
    const told: CastMember = { id: castId, name: 'Hetty Vance', role: '', colour: 3, bodyData: 'mixed' };
    const at = (confidence: number | null) =>
      createPictureMaker(engine, [told], { confidence }).check(document);
    expect(at(null).confidence).toBe(engine.ruleBook.confidence);
    expect(at(0.6).confidence).toBe(0.6);
    expect(at(0.6).counts.notKnown).toBeLessThan(at(null).counts.notKnown);
  });

  it('seats whoever sits there, drawn from their own measures', () => {
    const { bodies, sheet } = createPictureMaker(engine, [known]).picture(document);
    expect(bodies).toMatchObject([
      { name: 'Hetty Vance', colour: 3, placeId: `${added.pieceId}:2`, estimated: false },
    ]);
    expect(bodies[0]?.statureMm).toBeCloseTo(1511.3, 6);
    expect(sheet.rows.map((row) => row.name)).toEqual(['Hetty Vance']);
  });

  it('draws a body in the posture that was chosen, and no other body anew', () => {
    const maker = createPictureMaker(engine, [known]);
    const usual = maker.picture(document);
    const chosen = maker.picture(
      choosePosture(document, added.pieceId, 2, { nudge: { leftMm: 40, aheadMm: 0 } }),
    );
    const shift = (n: 0 | 2) =>
      chosen.bodies[0]!.pose.joints.pelvis[n] - usual.bodies[0]!.pose.joints.pelvis[n];
    expect(Math.hypot(shift(0), shift(2))).toBeCloseTo(40, 6);
    expect(chosen.bodies[0]!.pose).not.toBe(usual.bodies[0]!.pose);
    expect(chosen.sheet.rows).toEqual(usual.sheet.rows);
  });

  it('keeps feet of those opposite apart, each made once for as long as nothing there changes', () => {
    const maker = createPictureMaker(engine, []);
    const man = { kind: 'mannequin', bodyData: 'men', measure: 'stature', percentile: 95 } as const;
    const woman = { ...man, bodyData: 'women', percentile: 50 } as const;
    const benches = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
    const seated = benches.pieces
      .filter(({ kind }) => kind === 'bench')
      .reduce((document, { id }) => seatSitter(document, id, 1, man), benches);
    const pair = seatSitter(seated, seated.seating[1]!.pieceId, 2, woman);
    const { bodies, parts } = maker.picture(pair);
    const back = bodies.filter(({ pose }) => pose.notes.some(({ kind }) => kind === 'feet-drawn-back'));
    expect(back).toHaveLength(2);
    expect(back.every(({ at }) => at.feet!.backMm > 0)).toBe(true);
    for (const { overlaps } of sitterDistances(bodies, parts)) {
      expect(overlaps.filter(({ segment }) => segment.includes('foot'))).toEqual([]);
    }
    const noted = { ...pair, pieces: pair.pieces.map((piece) => ({ ...piece, note: 'new' })) };
    maker.picture(noted).bodies.forEach(({ pose }, i) => expect(pose).toBe(bodies[i]!.pose));
  });

  it('is made once for a document, so that nothing is computed again while it is looked at', () => {
    const maker = createPictureMaker(engine, [known]);
    expect(maker.picture(document)).toBe(maker.picture(document));
    const moved = { ...document, pieces: document.pieces.map((piece) => ({ ...piece, note: 'new' })) };
    expect(maker.picture(moved).bodies[0]?.pose).toBe(maker.picture(document).bodies[0]?.pose);
  });

  it('shows readers without measures the server’s verdicts and body, and draws no broken tape', () => {
    const { id, name, role, colour } = known;
    const server = serverSheet();
    const picture = createPictureMaker(engine, [{ id, name, role, colour }], { server }).picture(document);
    expect(picture.sheet).toBe(server);
    expect(picture.bodies).toHaveLength(1);
    expect(Number.isFinite(picture.bodies[0]?.pose.headTopMm)).toBe(true);
    for (const tape of tapeLines(document, picture.sheet, added.pieceId)) {
      if (tape.kind === 'dimension') expect(Number.isFinite(tape.valueMm)).toBe(true);
    }
  });
});
