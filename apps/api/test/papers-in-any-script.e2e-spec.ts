import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { as, createWorkshop, type Person } from './factories/people';
import { createCastMember, createProduction, createSet, type SetPlace } from './factories/productions';
import { startTestApp, type TestApp } from './test-app';

const NAMES = {
  workshop: 'Майстерня «Їжак»',
  production: 'Поезд на Čop (不)',
  set: 'Τραπεζαρία',
  cast: [
    'Дарья Ёлкина-Воробьёва',
    'Ελένη Παπαδοπούλου',
    'Nguyễn Thị Phương',
    'Անահիտ, ნინო, דנה, محمد',
    '王伟',
  ],
};
const MARK = '* romanised: this paper has no letters of that script';

describe('papers with names in any script', () => {
  const folder = mkdtempSync(join(tmpdir(), 'scripts-'));
  let test: TestApp;
  let owner: Person;
  let place: SetPlace;

  beforeAll(async () => {
    test = await startTestApp();
    const workshop = await createWorkshop(test, NAMES.workshop);
    owner = workshop.owner;
    const production = await createProduction(test, { name: NAMES.production }, workshop);
    const castIds: string[] = [];
    for (const name of NAMES.cast) castIds.push(await createCastMember(test, production, { name }));
    place = await createSet(test, production, { name: NAMES.set, arrangement: 'banquette' });
    await seatAndIssue(castIds);
  });
  afterAll(async () => {
    await test.close();
    rmSync(folder, { recursive: true });
  });

  const member = () => as(test, owner);
  async function seatAndIssue(castIds: string[]): Promise<void> {
    const draft = await member().get(`${place.setPath}/draft`).expect(200);
    const { number, document } = draft.body;
    const bench = document.pieces.find(({ kind }: { kind: string }) => kind === 'bench');
    document.seating = castIds.map((castId, index) => ({
      pieceId: bench.id,
      place: index + 1,
      sitter: { kind: 'cast', castId },
    }));
    const saved = await member()
      .put(`${place.setPath}/draft`)
      .send({ baseNumber: number, document })
      .expect(200);
    await member()
      .post(`${place.setPath}/revisions`)
      .send({ baseNumber: saved.body.number, note: '' })
      .expect(201);
  }

  async function read(path: string, name: string) {
    const { body } = await member().get(path).expect(200);
    const file = join(folder, name);
    writeFileSync(file, body as Buffer);
    const text = execFileSync('pdftotext', [file, '-'], { encoding: 'utf8' }).normalize('NFC');
    const info = execFileSync('pdfinfo', [file], { encoding: 'utf8' });
    return { text, info, bytes: body as Buffer, oneLine: text.replace(/\s+/g, ' ') };
  }
  const fitSheet = () => read(`${place.setPath}/draft/fit-sheet.pdf`, 'fit-sheet.pdf');
  async function order(spec: Record<string, string>, title: string) {
    const made = await member()
      .post(`${place.path}/orders`)
      .send({ setId: place.setId, revisionLetter: 'A', title, spec })
      .expect(201);
    return read(`${place.path}/orders/${made.body.id}/spec.pdf`, 'spec.pdf');
  }

  it('are read back from the fit sheet as they were typed', async () => {
    const { oneLine } = await fitSheet();
    for (const name of [...NAMES.cast.slice(0, 3), NAMES.workshop, NAMES.set])
      expect(oneLine).toContain(name);
    for (const name of ['Անահիտ', 'ნინო', 'דנה', 'محمد']) expect(oneLine).toContain(name);
    expect(oneLine).toContain('WangWei*');
    expect(oneLine).toContain('Поезд на Čop (Bu*)');
    expect(oneLine).toContain(MARK);
    expect(oneLine).not.toContain('?');
  });

  it('are read back from a cushion order, words of the order too', async () => {
    const { oneLine } = await order(
      { cover: 'сливовый мокет, 54″', notes: 'Dây kéo phía sau. Ράψε το φερμουάρ πίσω. 請用拉鍊' },
      'Подушки для вагона',
    );
    for (const words of ['сливовый мокет', 'Dây kéo phía sau.', 'Ράψε το φερμουάρ πίσω.', NAMES.set])
      expect(oneLine).toContain(words);
    expect(oneLine).toContain('QingYongLaLian*');
    expect(oneLine).toContain(MARK);
    expect(oneLine).not.toContain('?');
  });

  it('stand in the properties of the file as they were typed', async () => {
    const { info } = await fitSheet();
    expect(info).toMatch(/Title: +Поезд на Čop \(不\), Τραπεζαρία: fit sheet of draft 2/);
    expect(info).toMatch(/Author: +Майстерня «Їжак»/);
  });

  it('give the same bytes every time', async () => {
    const [first, second] = [await fitSheet(), await fitSheet()];
    expect(first.bytes.equals(second.bytes)).toBe(true);
  });

  it('say nothing of romanising where nothing was romanised', async () => {
    await member().patch(place.path).send({ name: 'Train' }).expect(200);
    const { oneLine, bytes } = await order({ cover: 'plum moquette' }, 'Seats');
    expect(oneLine).not.toContain('romanised');
    expect(bytes.includes('DejaVuSans')).toBe(true);
  });
});
