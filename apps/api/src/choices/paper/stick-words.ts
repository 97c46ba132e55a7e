import { dimensionValue, markWords, type Stretch } from '@settlewright/geometry';
import type { Flow } from '../../fit-checks/paper/flow';
import { linesNeeded, paragraph, type Prose } from '../../paper/paragraph';
import { leading } from '../../paper/sheet';
import { EVERY_RULE } from '../every-rule';
import { BAR_MM, drawDots, drawHatched, drawReach, drawSolid } from './stick-bar';
import { isTried, type StickPaper } from './stick-paper';

const LINE = leading(9);
const SAMPLE_MM = 11;

/** What number this is, of which pieces, by which checks. */
export function drawHeading(flow: Flow, { stick, rules, confidence }: StickPaper): void {
  const { label, marks, tableMarks } = stick.dimension;
  flow.sheet.text(`Story stick: ${label.charAt(0).toLowerCase()}${label.slice(1)}`, flow.left, flow.y + 7, {
    size: 22,
    weight: 300,
  });
  flow.y += 9 + LINE;
  const tables = tableMarks.length > 0 ? `; ${markWords(tableMarks)} move along` : '';
  const checks =
    stick.shownRule === EVERY_RULE
      ? 'every check of a person that it moves'
      : `the check “${rules.find(({ id }) => id === stick.shownRule)?.name ?? stick.shownRule}”`;
  say(flow, [
    { text: `${markWords(marks)}${tables}`, weight: 600 },
    { text: `. By ${checks}. ${confidence}` },
  ]);
  drawKey(flow, stick.detail === 'full' && stick.rows.some(({ estimated }) => estimated));
}

function drawKey(flow: Flow, withGuess: boolean): void {
  const y = flow.y - LINE + 5.2;
  const draw = [
    ['fits', (left: number) => drawSolid(flow.sheet, sample(left, y), { dash: [], grey: 70 })],
    ['tight', (left: number) => drawHatched(flow.sheet, sample(left, y), [])],
    ['not known', (left: number) => drawDots(flow.sheet, sample(left, y))],
    ['blank: won’t fit', undefined],
    ...(withGuess
      ? ([
          ['best guess', (left: number) => drawHatched(flow.sheet, sample(left, y), [1.1, 0.8])],
          [
            'as far as it may reach, each check by itself',
            (left: number) => drawReach(flow.sheet, sample(left, y)),
          ],
        ] as const)
      : []),
  ] as const;
  let x = flow.left;
  for (const [words, mark] of draw) {
    if (mark) {
      mark(x);
      x += SAMPLE_MM + 1.5;
    }
    flow.sheet.text(words, x, y + 1.1);
    x += flow.sheet.textWidth(words) + 6;
  }
  flow.y = y + BAR_MM / 2 + 2.5;
}

const sample = (left: number, y: number) => ({ left, right: left + SAMPLE_MM, y });

/** What suits everybody, where the ranges come from, and what the shares rest on. */
export function drawWords(flow: Flow, input: StickPaper): void {
  flow.y += LINE + 0.6;
  for (const words of [common(input), lookedAt(input), ...input.stick.bands.map((band) => band.words)]) {
    if (words) say(flow, words);
  }
  for (const { name, id, sourceWord, sources } of input.rules) {
    const cited = sources.map(({ cite, read }) => `${cite} (${read})`).join('; ');
    say(flow, [{ text: `${name} `, weight: 600 }, { text: `${id}, ${sourceWord}: ${cited}` }]);
  }
  const { shares } = input.stick;
  if (!shares) return;
  const { name, source, cautions, people } = shares.told;
  say(flow, [
    { text: `${name} `, weight: 600 },
    { text: `${people.toLocaleString('en')} people drawn. ${[source, ...cautions].map(sentence).join(' ')}` },
  ]);
}

const sentence = (words: string): string => words.replace(/[.\s]*$/, '.');

function common({ stick, style }: StickPaper): string {
  const { rows, allFit, allTight, dimension } = stick;
  if (rows.length === 0) return 'Nobody sits here whose checks this number moves.';
  const show = (value: number) => dimensionValue(value, dimension.unit, style);
  const span = (list: readonly Stretch[]) =>
    list
      .map(({ from, to }) => (to - from < 1e-6 ? show(from) : `${show(from)} to ${show(to)}`))
      .join(' and ');
  const everybody = rows.length === 1 ? 'The one sitter' : `All ${rows.length} sitters`;
  if (allFit.length > 0) return `${everybody}: fits from ${span(allFit)}, by verdicts at tried values.`;
  if (allTight.length > 0) {
    return `${everybody}: at least tight from ${span(allTight)}, by verdicts at tried values; no tried value fits.`;
  }
  return 'No tried value is known to suit everybody here.';
}

function lookedAt({ stick, style }: StickPaper): string {
  const { values, dimension, detail } = stick;
  if (detail === 'full' || values.length === 0) return '';
  const show = (value: number) => dimensionValue(value, dimension.unit, style);
  const ends = `${show(values[0] as number)} to ${show(values.at(-1) as number)}`;
  const tried = isTried(stick) ? ' The tried value is the nearest of these.' : '';
  return `Sitters were looked at from ${ends} in steps of ${show(stick.step)}.${tried}`;
}

function say(flow: Flow, prose: Prose): void {
  flow.need(linesNeeded(flow.sheet, prose, flow.width) * LINE + LINE);
  flow.y = paragraph(flow.sheet, prose, flow.left, flow.y, flow.width) + 0.8;
}
