import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { ARRANGEMENTS, FOAM_PRESETS, type FoamGrade } from '@settlewright/geometry';
import { AuditEntry } from '../src/audit/entities/audit-entry.entity';
import { as, createMember } from './factories/people';
import { createProduction, createSet, type SetPlace } from './factories/productions';
import { startTestApp, type TestApp } from './test-app';

const [{ source: _, ...PRESET }] = FOAM_PRESETS as [(typeof FOAM_PRESETS)[number]];
const OWN_FOAM: FoamGrade = { ...PRESET, name: 'two layers', wrapMm: 12 };

describe('how a workshop makes cushions', () => {
  let test: TestApp;
  let place: SetPlace;
  let path: string;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());
  beforeEach(async () => {
    const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
    place = await createSet(test, await createProduction(test), { arrangement: undefined, document });
    path = `/workshops/${place.workshop.id}/cushion-settings`;
  });
  const owner = () => as(test, place.workshop.owner);
  const save = (baseNumber: number, settings: unknown) => owner().put(path).send({ baseNumber, settings });
  const order = async (revisionLetter: string) => {
    const { body } = await owner()
      .post(place.setPath.replace(/\/sets\/.*/, '/orders'))
      .send({ setId: place.setPath.split('/').at(-1), revisionLetter, title: 'Seats' })
      .expect(201);
    const read = await owner()
      .get(`${place.setPath.replace(/\/sets\/.*/, '/orders')}/${body.id}`)
      .expect(200);
    return read.body.cushions[0] as { finishedMm: { widthMm: number } };
  };
  const issue = () => owner().post(`${place.setPath}/revisions`).send({ baseNumber: 1 }).expect(201);

  it('is the usual way until something is set, read by every member and changed by owner and designer', async () => {
    const usual = {
      number: 0,
      settings: { allowancesMm: {}, foams: [] },
      changedAt: null,
      changedByName: null,
    };
    for (const role of ['designer', 'carpenter', 'reviewer'] as const) {
      const member = await createMember(test, place.workshop.id, role);
      const { body } = await as(test, member).get(path).expect(200);
      expect(body).toEqual(usual);
      if (role !== 'designer') {
        await as(test, member).put(path).send({ baseNumber: 0, settings: usual.settings }).expect(403);
      }
    }
    const wanted = { allowancesMm: { wallGap: 6 }, foams: [OWN_FOAM] };
    const { body } = await save(0, wanted).expect(200);
    expect(body).toMatchObject({ number: 1, settings: wanted, changedAt: expect.any(String) });
    expect((await owner().get(path).expect(200)).body.settings).toEqual(wanted);
    const recorded = await test.dataSource.manager.find(AuditEntry, {
      where: { subjectId: place.workshop.id, action: 'cushion-settings.changed' },
    });
    expect(recorded.map(({ detail }) => detail)).toEqual([{ allowances: ['wallGap'], foams: 1 }]);
  });

  it.each([
    [{ allowancesMm: { seam: -1 }, foams: [] }, 'settings.allowancesMm.seam'],
    [{ allowancesMm: { seam: '12' }, foams: [] }, 'settings.allowancesMm.seam'],
    [{ allowancesMm: { hem: 12 }, foams: [] }, 'settings.allowancesMm'],
    [{ allowancesMm: {}, foams: [{ ...OWN_FOAM, ifd25N: 5 }] }, 'settings.foams.0.ifd25N'],
    [{ allowancesMm: {}, foams: [OWN_FOAM, OWN_FOAM] }, 'settings.foams'],
    [{ allowancesMm: {} }, 'settings.foams'],
  ])('refuses %j by name', async (settings, field) => {
    const { body } = await save(0, settings).expect(400);
    expect(body.fields[0]).toMatchObject({ path: field });
  });

  it('is not written over by somebody who began from older settings', async () => {
    await save(0, { allowancesMm: { wallGap: 6 }, foams: [] }).expect(200);
    const { body } = await save(0, { allowancesMm: { wallGap: 9 }, foams: [] }).expect(409);
    expect(body).toMatchObject({ code: 'settings-moved-on', currentNumber: 1 });
    expect((await owner().get(path).expect(200)).body.settings.allowancesMm).toEqual({ wallGap: 6 });
  });

  it('is kept with a revision as it was when that was issued', async () => {
    await issue();
    await save(0, { allowancesMm: { wallGap: 13.175 }, foams: [] }).expect(200);
    const before = (await order('A')).finishedMm.widthMm;
    await issue();
    const after = (await order('B')).finishedMm.widthMm;
    expect(before - after).toBeCloseTo(10, 6);
    await save(1, { allowancesMm: {}, foams: [] }).expect(200);
    expect((await order('B')).finishedMm.widthMm).toBeCloseTo(after, 9);
    expect((await order('A')).finishedMm.widthMm).toBeCloseTo(before, 9);
  });
});
