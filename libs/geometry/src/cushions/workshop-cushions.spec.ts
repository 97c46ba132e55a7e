import { describe, expect, it } from 'vitest';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { CUSHION_SETTINGS } from './cushion-settings.ts';
import { deriveCushions } from './derive-cushions.ts';
import { FOAM_PRESETS, foamGradeSchema } from './foam-grades.ts';
import {
  ALLOWANCE_KEYS,
  allowanceLimits,
  cushionRules,
  keptCushionRules,
  NO_OWN_CUSHIONS,
  workshopCushionsSchema,
} from './workshop-cushions.ts';

const fault = (change: unknown) =>
  workshopCushionsSchema.safeParse(change).error?.issues.map(({ path }) => path.join('.'));

describe('a workshop’s own cushions', () => {
  it('are the usual ones until it sets something, and its own are called a shop rule', () => {
    expect(cushionRules(NO_OWN_CUSHIONS).settings).toEqual(CUSHION_SETTINGS);
    const { settings } = cushionRules({ allowancesMm: { seam: 16 }, foams: [] });
    expect(settings.seam).toEqual({ ...CUSHION_SETTINGS.seam, valueMm: 16, source: 'shop rule' });
    expect(settings.zipWrap).toBe(CUSHION_SETTINGS.zipWrap);
  });

  it('reach the cushions', () => {
    const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
    const { settings } = cushionRules({ allowancesMm: { seam: 20, wallGap: 10 }, foams: [] });
    const [usual, own] = [deriveCushions(document)[0]!, deriveCushions(document, settings)[0]!];
    expect(usual.finishedMm.widthMm - own.finishedMm.widthMm).toBeCloseTo(10 - 3.175, 6);
    const wide = ({ making }: typeof own) => Math.max(...making!.panels[0]!.cut.map(({ at }) => at[0]));
    expect(wide(own) - own.finishedMm.widthMm).toBeCloseTo(20, 6);
  });

  it('stay within what an allowance may be, and know no others', () => {
    for (const key of ALLOWANCE_KEYS) {
      const { minMm, maxMm } = allowanceLimits(key);
      const { valueMm } = CUSHION_SETTINGS[key];
      expect(valueMm >= minMm && valueMm <= maxMm).toBe(true);
      expect(fault({ allowancesMm: { [key]: maxMm + 1 }, foams: [] })).toEqual([`allowancesMm.${key}`]);
    }
    expect(fault({ allowancesMm: { hem: 3 }, foams: [] })).toEqual(['allowancesMm']);
    const [grade] = FOAM_PRESETS.map(({ source: _, ...one }) => one);
    expect(fault({ allowancesMm: {}, foams: [grade] })).toBeUndefined();
    expect(fault({ allowancesMm: {}, foams: [grade, { ...grade, name: 'FIRM seat' }] })).toEqual(['foams']);
  });

  it('are kept with a revision; what was not known then is as usual', () => {
    expect(keptCushionRules(null).settings).toBe(CUSHION_SETTINGS);
    const { settings } = cushionRules({ allowancesMm: { seam: 16 }, foams: [] });
    const { buttonPull: _, ...older } = settings;
    const kept = keptCushionRules({ settings: older as typeof settings, foams: [] });
    expect(kept.settings.seam.valueMm).toBe(16);
    expect(kept.settings.buttonPull).toEqual(CUSHION_SETTINGS.buttonPull);
  });

  it('begin with presets that say where they come from', () => {
    for (const { source, ...grade } of FOAM_PRESETS) {
      expect(foamGradeSchema.safeParse(grade).success).toBe(true);
      expect(source).toBe('from memory');
    }
  });
});
