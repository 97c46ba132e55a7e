import {
  scaleWords,
  shopScales,
  type LengthStyle,
  type SetView,
  type ViewDirection,
} from '@settlewright/geometry';
import { dxfOf, hiddenWords, setDrawing, svgOf } from '@settlewright/geometry/export';
import { useMemo, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Dialog } from '@/components/dialog.tsx';
import { LengthField } from '@/components/length-field.tsx';
import { Notice } from '@/components/notice.tsx';
import { entryOf, type QuantityEntry } from '@/components/quantity-entry.ts';
import { Select } from '@/components/select.tsx';
import { announce } from '@/lib/announce.ts';
import { dateWords, todayWords } from '@/lib/dates.ts';
import { keepFile } from '@/lib/download.ts';
import { Toggle } from '../components/toggle.tsx';
import { usePicture, useSurroundings } from '../room-context.tsx';
import { readPalette } from '../scene/palette.ts';
import { sectionPlaneNow } from '../section/section-store.ts';
import { shotSize } from '../views/view-shot.tsx';
import { useShots } from '../views/use-shots.tsx';
import { aboutView } from '../views/view-title.ts';
import { pdfOf, sheetsOf } from './pdf-sheets.ts';
import { MOST_SHEETS, pixelWords, sheetWords, viewSheetWords } from './save-words.ts';
import { unprinted, type PaperKey } from './sheet-frame.ts';
import { pdfOfViews } from './view-sheets.ts';
import { loadSheetFonts } from './sheet-fonts.ts';
import { pngOf, takeStill } from './still.ts';
import { CUT_WORDS, fileName, usualCut, usualScale, VIEW_CHOICES, viewName } from './views-to-save.ts';

const FILES = [
  { value: 'pdf', words: 'PDF to print, to scale' },
  { value: 'svg', words: 'SVG picture, to scale' },
  { value: 'dxf', words: 'DXF for drawing programs, full size' },
  { value: 'png', words: 'PNG picture of the scene' },
  { value: 'glb', words: 'glTF model of the pieces' },
] as const;
type FileKind = (typeof FILES)[number]['value'];

const TYPES: Record<FileKind, string> = {
  pdf: 'application/pdf',
  svg: 'image/svg+xml',
  dxf: 'image/vnd.dxf',
  png: 'image/png',
  glb: 'model/gltf-binary',
};
const FARTHEST_MM = 50_000;
const PAPER_CHOICES = [
  { value: 'letter', words: 'Letter' },
  { value: 'a4', words: 'A4' },
] as const;

const scalesOf = (system: LengthStyle['system']) =>
  shopScales(system)
    .filter((scale) => scale <= 200)
    .map((value) => ({ value, words: scaleWords(system, value) }));

/** What a picture or sheet shows when no named view is chosen, and what all of them are called. */
const NONE = '';
const ALL = 'all';
const WIDTHS = [1280, 1920, 2560, 3840].map((value) => ({ value, words: `${value} pixels wide` }));
const PRINT_PX = 2400;

/** Saves a plan, an elevation, a section, the scene or its model as a file; all of it is made in the browser. */
export default function SaveDrawing({ onClose }: { onClose: () => void }) {
  const { path, setName, style, issued } = useSurroundings();
  const picture = usePicture();
  const { document: set, parts } = picture;
  const { shoot, stage } = useShots(picture);
  const named = set.views ?? [];
  const [kind, setKind] = useState<FileKind>('pdf');
  // Where a cut is shown, the drawing begins with that one.
  const [shownCut] = useState(() => sectionPlaneNow(path.setId));
  const [direction, setDirection] = useState<ViewDirection>(shownCut?.direction ?? 'above');
  const [isCut, setIsCut] = useState(shownCut !== undefined);
  const [cut, setCut] = useState<QuantityEntry>(() => entryOf(shownCut?.atMm ?? usualCut(set, direction)));
  const [dashed, setDashed] = useState(false);
  const [scale, setScale] = useState(() => usualScale(style.system));
  const [paper, setPaper] = useState<PaperKey>(style.system === 'millimetres' ? 'a4' : 'letter');
  const [namedId, setNamedId] = useState(NONE);
  const [widthPx, setWidthPx] = useState(1920);
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);

  const shown = kind === 'pdf' || kind === 'png' ? namedId : NONE;
  const shots = named.filter(({ id }) => shown === ALL || id === shown);
  const isDrawing = kind !== 'png' && kind !== 'glb' && shots.length === 0;
  const version = issued
    ? `Revision ${issued.letter}, issued ${dateWords(issued.issuedAt)}`
    : `Draft, ${todayWords()}`;
  const hidden = hiddenWords(set);
  const sectionMm = isCut ? (cut.value ?? undefined) : undefined;
  const view = useMemo(
    (): SetView => ({ direction, sectionMm, hidden: dashed ? 'dashed' : 'left-out', scale }),
    [direction, sectionMm, dashed, scale],
  );
  const drawing = useMemo(() => setDrawing(set, view, style), [set, view, style]);
  const title = `${setName}: ${drawing.title}`;
  const preview = useMemo(
    () => `data:image/svg+xml,${encodeURIComponent(svgOf(drawing, title))}`,
    [drawing, title],
  );
  const sheets = kind !== 'pdf' ? 0 : isDrawing ? sheetsOf(drawing, paper).length : shots.length;

  async function contents(): Promise<BlobPart> {
    switch (kind) {
      case 'svg':
        return svgOf(drawing, title);
      case 'dxf':
        return dxfOf(drawing, style.system === 'millimetres' ? 'millimetres' : 'inches');
      case 'pdf': {
        // A drawing says on itself what is hidden; a picture has the line under it for that.
        const said = !isDrawing && hidden ? `${version}; ${hidden}` : version;
        const words = { setName, version: said, style };
        const texts = [
          setName,
          ...(isDrawing ? drawing.words : []).map(({ text }) => text),
          ...shots.map(({ name }) => name),
        ];
        const lost = unprinted(texts);
        if (lost.length > 0) {
          throw new Error(
            `The letters of a printed sheet are Latin ones; ${lost.map((letter) => `“${letter}”`).join(', ')} cannot be printed. Write the name in Latin letters, or save an SVG picture.`,
          );
        }
        const fonts = await loadSheetFonts();
        if (isDrawing) return pdfOf(drawing, words, paper, fonts);
        const pictures = [];
        for (const one of shots) {
          const canvas = await shoot({ view: one, width: PRINT_PX, ground: '#ffffff', forPaper: true });
          pictures.push({ name: one.name, about: aboutView(one, style), picture: canvas });
        }
        return pdfOfViews(pictures, words, paper, fonts);
      }
      case 'png': {
        const ground = getComputedStyle(document.documentElement).getPropertyValue('--color-paper');
        const [one] = shots;
        const still = one
          ? await pngOf(await shoot({ view: one, width: widthPx, ground, forPaper: false }))
          : await takeStill(ground);
        if (!still) throw new Error('The scene is not drawn at the moment, so there is no picture of it.');
        return still;
      }
      case 'glb': {
        const { glbOf } = await import('./scene-glb.ts');
        return glbOf(set, parts, readPalette(document.documentElement).tones, setName);
      }
    }
  }

  async function save() {
    setBusy(true);
    setProblem(null);
    try {
      const what = isDrawing ? [viewName(view)] : shown === ALL ? ['views'] : shots.map((one) => one.name);
      const name = fileName([setName, ...(issued ? [`revision ${issued.letter}`] : []), ...what], kind);
      keepFile(new Blob([await contents()], { type: TYPES[kind] }), name);
      announce(`${name} is saved.`);
    } catch (error) {
      setProblem(error instanceof Error ? error.message : 'The file could not be made.');
    } finally {
      setBusy(false);
    }
  }

  return (
    <Dialog
      open
      wide
      onClose={onClose}
      title="Save a drawing"
      describe="Made here in the browser, from the boards and cushions of the pieces."
    >
      {problem && (
        <Notice tone="wont" className="mb-5">
          {problem}
        </Notice>
      )}
      <div className="grid gap-x-8 gap-y-5 tablet:grid-cols-[17rem_minmax(0,1fr)]">
        <div className="grid content-start gap-4">
          <Select
            label="File"
            value={kind}
            options={FILES}
            onChange={(next) => {
              setKind(next);
              if (namedId === ALL) setNamedId(NONE);
            }}
          />
          {named.length > 0 && (kind === 'pdf' || kind === 'png') && (
            <Select
              label="Named view"
              value={namedId}
              options={[
                {
                  value: NONE,
                  words: kind === 'pdf' ? 'None, a drawing to scale' : 'None, the scene as it stands',
                },
                ...named.map(({ id, name }) => ({ value: id, words: name })),
                ...(kind === 'pdf' ? [{ value: ALL, words: 'All named views, a sheet each' }] : []),
              ]}
              onChange={setNamedId}
            />
          )}
          {kind === 'png' && shots[0] && (
            <Select label="Size" value={widthPx} options={WIDTHS} onChange={setWidthPx} />
          )}
          {isDrawing && (
            <>
              <Select
                label="View"
                value={direction}
                options={VIEW_CHOICES}
                onChange={(next) => {
                  setDirection(next);
                  setCut(entryOf(usualCut(set, next)));
                }}
              />
              <div className="flex flex-wrap gap-x-4">
                <Toggle on={isCut} onChange={setIsCut}>
                  Cut the set
                </Toggle>
                <Toggle on={dashed} onChange={setDashed}>
                  Dash what is hidden
                </Toggle>
              </div>
              {isCut && (
                <LengthField
                  label={CUT_WORDS[direction]}
                  entry={cut}
                  onChange={setCut}
                  minMm={direction === 'above' ? 0 : -FARTHEST_MM}
                  maxMm={FARTHEST_MM}
                />
              )}
              <Select
                label={kind === 'dxf' ? 'Words laid out for the scale' : 'Scale'}
                value={scale}
                options={scalesOf(style.system)}
                onChange={setScale}
              />
            </>
          )}
          {kind === 'pdf' && (
            <Select label="Paper" value={paper} options={PAPER_CHOICES} onChange={setPaper} />
          )}
          <p className="text-sm text-ink-2" role="status">
            {kind === 'pdf' && (isDrawing ? sheetWords(sheets, paper) : viewSheetWords(shots.length, paper))}
            {kind === 'dxf' && `Full size, in ${style.system === 'millimetres' ? 'millimetres' : 'inches'}.`}
            {kind === 'png' && shots[0] && pixelWords(shotSize(shots[0], widthPx))}
            {kind === 'png' &&
              !shots[0] &&
              'The scene as it stands on the screen, with the bodies shown there; no tapes, no names.'}
            {kind === 'glb' && 'In metres, without bodies.'}
            {hidden && ` ${hidden}; left out of the file.`}
          </p>
          <div className="flex flex-wrap gap-3">
            <Button
              look="main"
              busy={busy}
              busyWords="Drawing"
              disabled={
                sheets > MOST_SHEETS ||
                (isDrawing && isCut && (cut.problem !== undefined || cut.value === null))
              }
              onClick={() => void save()}
            >
              Save
            </Button>
            <Button onClick={onClose}>Close</Button>
          </div>
        </div>
        {stage}
        {isDrawing && (
          <img
            src={preview}
            alt={`${title}. ${drawing.words
              .filter(({ layer }) => layer === 'dimension')
              .map(({ text }) => text)
              .join(', ')}.`}
            className="max-h-[32rem] w-full self-start bg-white object-contain max-tablet:order-first max-tablet:max-h-64"
          />
        )}
      </div>
    </Dialog>
  );
}
