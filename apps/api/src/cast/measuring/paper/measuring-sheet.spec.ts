import { loadRuleBook, MEASURE_INFO, TAPE_MEASURE_KEYS } from '@settlewright/anthropometry';
import { describe, expect, it } from '@jest/globals';
import { readSeedData } from '../../../common/seed-data';
import { paperText, paperWords } from '../../../../test/factories/papers';
import type { CastMember } from '../../entities/cast-member.entity';
import { measuringSheetPdf } from './measuring-sheet-pdf';

const person = (change: Partial<CastMember>): CastMember =>
  ({
    id: 'o',
    name: 'Ottilie Brandt',
    role: 'the conductor',
    statureMm: 1575,
    statureSource: 'told',
    weightKg: null,
    measured: { popliteal_height: { mm: 394 } },
    ...change,
  }) as CastMember;

const LONG_NAME =
  'Maximiliana Wilhelmina Featherstonehaugh-Cholmondeley of the Upper Larch Junction Ladies’ Travelling Chorus';

const sheet = (paper: 'a4' | 'letter', people?: Parameters<typeof measuringSheetPdf>[0]['people']) =>
  measuringSheetPdf({
    people: people ?? [
      {
        person: person({}),
        next: {
          castId: 'o',
          sets: ['Dining car'],
          uncertain: 4,
          order: [
            { key: 'elbow_rest_height', settles: 1.7, ruleIds: ['SILL-01', 'TABLE-05'] },
            { key: 'thigh_clearance', settles: 0.4, ruleIds: [] },
          ],
        },
        placesLeftOut: 0,
      },
      {
        person: person({ id: 't', name: 'Tobias Marr', role: '', measured: {} }),
        next: undefined,
        placesLeftOut: 2,
      },
    ],
    ruleBook: loadRuleBook(readSeedData('fit-rules')),
    style: { system: 'feet-inches', roundTo: 8 },
    paper,
    timeZone: 'Europe/Vienna',
    workshop: 'Larch Street Shop',
    productionName: 'Supper at Larch Junction',
    at: new Date('2026-03-01T10:00:00Z'),
  });

describe('measuring sheet', () => {
  it.each(['a4', 'letter'] as const)('names everybody and every measure on %s', async (paper) => {
    const text = await paperText(sheet(paper));
    const pages = text.split('\f').filter((page) => page.trim() !== '');
    expect(pages).toHaveLength(4);
    const [ottilie, tobias] = [pages.slice(0, 2).join(' '), pages.slice(2).join(' ')];
    const keys = ['stature', 'weight_kg', ...TAPE_MEASURE_KEYS] as const;
    for (const words of [ottilie, tobias]) {
      const plain = words.replace(/\s+/g, ' ');
      for (const key of keys) expect(plain.toLowerCase()).toContain(MEASURE_INFO[key].plain);
      expect(plain).toMatch(/personal data/);
    }
    expect(ottilie).toContain('Ottilie Brandt');
    expect(ottilie).not.toContain('Tobias');
    expect(tobias).toContain('Tobias Marr');
    expect(tobias).not.toContain('Ottilie');
  });

  it('puts what settles most first and says why', async () => {
    const [first = '', , other = ''] = (await paperText(sheet('a4'))).split('\f');
    expect(first.indexOf('Elbow rest')).toBeLessThan(first.indexOf('Sitting height'));
    expect(first.replace(/\s+/g, ' ')).toMatch(/First: settles elbow to sill/i);
    expect(first).toMatch(/Told: 5′ 2″/);
    expect(other).not.toMatch(/First: settles/);
  });

  it('says on the sheet of whom not every place was looked at', async () => {
    const [ottilie = '', , tobias = ''] = (await paperText(sheet('a4'))).split('\f');
    expect(tobias.replace(/\s+/g, ' ')).toMatch(/2 places of this person could not be looked at in time/);
    expect(ottilie).not.toMatch(/looked at in time/);
  });

  it.each(['a4', 'letter'] as const)('keeps a very long name out of the instruction on %s', async (paper) => {
    for (const name of [LONG_NAME, 'W'.repeat(120), 'Ottilie Brandt']) {
      const people = [
        { person: person({ name, role: 'R '.repeat(60).trim() }), next: undefined, placesLeftOut: 0 },
      ];
      const words = (await paperWords(sheet(paper, people))).filter(({ page }) => page === 1);
      const how = words.find(({ text }) => text === 'Barefoot,');
      const firstBox = Math.min(...words.filter(({ text }) => text === 'mm').map(({ yMin }) => yMin));
      if (!how) throw new Error('The instruction is missing.');
      const head = words.filter(({ yMin }) => yMin < how.yMin + 30);
      const left = head.filter(({ xMin }) => xMin < how.xMin - 1);
      expect(left.length).toBeGreaterThan(0);
      expect(Math.max(...left.map(({ xMax }) => xMax))).toBeLessThan(how.xMin);
      expect(how.yMin).toBeLessThan(firstBox);
      expect(words.map(({ text }) => text).join('')).toContain(name.replace(/\s/g, '').slice(0, 40));
    }
  });
});
