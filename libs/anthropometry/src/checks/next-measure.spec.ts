import { describe, expect, it } from 'vitest';
import { lapTable, place, set, sill } from '../../test/example-set.ts';
import { model, ruleBook } from '../../test/seed.ts';
import { quantile } from '../people/estimate.ts';
import type { KnownPerson } from '../people/person.ts';
import { checkSitter } from './check-set.ts';
import type { SitterRow } from './fit-sheet.ts';
import { isUncertainCell, nextMeasures } from './next-measure.ts';
import type { PlaceSituation } from './situation.ts';

const CONFIDENCE = 0.9;
const TOLD: KnownPerson = {
  bodyData: 'women',
  stature: { mm: 1650, source: 'told' },
  measured: {},
  shoeMm: 25,
  clothing: 'light',
};

const rowAt =
  (at: PlaceSituation) =>
  (person: KnownPerson, ruleIds?: readonly string[]): SitterRow =>
    checkSitter(
      {
        situation: set({ places: [at] }),
        ruleBook,
        model,
        settings: { backPosture: 'dining', trafficBehind: 'none' },
      },
      { id: 's', name: 'S', kind: 'cast', placeId: at.placeId, person },
      ruleIds,
    );

const next = (at: PlaceSituation, person: KnownPerson) =>
  nextMeasures({ person, model, rowFor: rowAt(at), confidence: CONFIDENCE });

describe('which tape measure next', () => {
  it('asks for the elbow where only the sill is in doubt', () => {
    const beside = place({ widthMm: 900, sills: [sill({ topMm: 407 + 232, centreToEdgeMm: 200 })] });
    const { uncertain, order } = next(beside, TOLD);
    expect(uncertain).toContain('SILL-01');
    expect(order[0]?.key).toBe('elbow_rest_height');
    expect(order[0]?.ruleIds).toContain('SILL-01');
  });

  it('counts what the measurement really settles', () => {
    const at = place({ table: lapTable({ undersideMm: 407 + 160, topMm: 407 + 190 }) });
    const { uncertain, order } = next(at, TOLD);
    const [first] = order;
    if (!first) throw new Error('nothing to measure');
    expect(first.settles).toBeGreaterThan(0);
    expect(first.settles).toBeLessThanOrEqual(uncertain.length);
    const total = order.reduce((sum, { settles }) => sum + settles, 0);
    expect(total).toBeLessThanOrEqual(uncertain.length + 1e-9);
  });

  it('asks only the uncertain rules again, and answers as if it asked all', () => {
    const at = place({ table: lapTable({ undersideMm: 407 + 160, topMm: 407 + 190 }) });
    const cells: number[] = [];
    const rowFor = (person: KnownPerson, ruleIds?: readonly string[]) => {
      const row = rowAt(at)(person, ruleIds);
      cells.push(row.cells.length);
      return row;
    };
    const found = nextMeasures({ person: TOLD, model, rowFor, confidence: CONFIDENCE });
    const whole = (person: KnownPerson) => rowAt(at)(person);
    expect(found).toEqual(nextMeasures({ person: TOLD, model, rowFor: whole, confidence: CONFIDENCE }));
    expect(found.order.length).toBeGreaterThan(0);
    expect(new Set(cells.slice(1))).toEqual(new Set([found.uncertain.length]));
    expect(cells[0]).toBeGreaterThan(found.uncertain.length);
  });

  it('never does worse than any other single measurement', () => {
    const at = place({
      seatTopFrontMm: 440,
      seatTopHipMm: 440,
      effectiveDepthMm: 455,
      table: lapTable({ undersideMm: 605, topMm: 640 }),
      sills: [sill({ topMm: 672 })],
    });
    const { uncertain, order } = next(at, TOLD);
    const row = rowAt(at);
    for (const key of ['popliteal_height', 'thigh_clearance', 'buttock_popliteal_length'] as const) {
      const belief = model.predict(TOLD).estimate(key);
      const settled = [0.1, 0.3, 0.5, 0.7, 0.9].map((p) => {
        const { cells } = row({ ...TOLD, measured: { [key]: quantile(belief, p) } });
        return cells.filter((cell) => uncertain.includes(cell.ruleId) && !isUncertainCell(cell, CONFIDENCE))
          .length;
      });
      const average = settled.reduce((sum, count) => sum + count, 0) / settled.length;
      expect(average, key).toBeLessThanOrEqual((order[0]?.settles ?? 0) + 0.25);
    }
    expect(order).toHaveLength(2);
    expect(order[0]?.key).not.toBe(order[1]?.key);
  });

  it('asks for nothing where everything is measured or nothing is in doubt', () => {
    const roomy = place({ seatTopFrontMm: 300, seatTopHipMm: 300, effectiveDepthMm: 430, widthMm: 2000 });
    const exact = model.mannequin({ bodyData: 'women', measure: 'stature', percentile: 50 });
    expect(next(roomy, exact)).toEqual({ uncertain: [], order: [] });
  });

  it('does not ask again for what was taken', () => {
    const beside = place({ sills: [sill({ topMm: 640, centreToEdgeMm: 200 })] });
    const person: KnownPerson = { ...TOLD, weightKg: 62, measured: { elbow_rest_height: 230 } };
    const keys = next(beside, person).order.map(({ key }) => key);
    expect(keys).not.toContain('elbow_rest_height');
    expect(keys).not.toContain('weight_kg');
  });
});
