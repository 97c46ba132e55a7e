import {
  CLOSURE_WORDS,
  type CushionSpec,
  formatLength,
  type LengthStyle,
  outlineExtent,
} from '@settlewright/geometry';

/** What a word of a section points to. */
type SectionPoint = 'top' | 'seam' | 'allowance' | 'middle' | 'foam' | 'board' | 'staples' | 'deck';

interface SectionWord {
  at: SectionPoint;
  text: string;
}

/** Words at either side of a section. */
export interface SectionWords {
  front: SectionWord[];
  back: SectionWord[];
}

/** Seam allowance: half of what a strip or side is cut larger. A plate may be cut larger for its crown or its corners. */
function seamAllowanceMm({ making }: Pick<CushionSpec, 'making'>): number | undefined {
  const panel = making?.panels.find(({ name }) => name === 'boxing' || name === 'side');
  return panel && (outlineExtent(panel.cut).depthMm - outlineExtent(panel.finished).depthMm) / 2;
}

/** What the section of a cushion says of its edges. */
export function sectionWords(spec: CushionSpec, style: LengthStyle): SectionWords {
  const { make, making, kind } = spec;
  const show = (mm: number) => formatLength(mm, { ...style, feet: false });
  const strip = show(making?.edgeHeightMm ?? spec.finishedMm.thicknessMm);
  const foam: SectionWord = {
    at: 'foam',
    text: `foam ${show(making?.foam.thicknessMm ?? spec.finishedMm.thicknessMm)}`,
  };
  const deck: SectionWord = { at: 'deck', text: kind === 'seat' ? 'deck' : 'back board' };
  const closed: SectionWord[] =
    make.closureEdge === 'back' && make.closure !== 'stapled'
      ? [{ at: 'middle', text: CLOSURE_WORDS[make.closure] }]
      : [];
  const inFront: SectionWord[] =
    make.closureEdge === 'front' && make.closure !== 'stapled'
      ? [{ at: 'middle', text: CLOSURE_WORDS[make.closure] }]
      : [];
  const seam = seamAllowanceMm(spec);
  const allowance: SectionWord[] = seam ? [{ at: 'allowance', text: `seam ${show(seam)}` }] : [];
  const welt: SectionWord = { at: 'seam', text: make.welt === 'none' ? 'plain seam' : 'welt' };
  switch (make.construction) {
    case 'boxed':
    case 'tight-boxed':
      return {
        front: [
          { at: 'top', text: 'plate' },
          welt,
          inFront[0] ?? { at: 'middle', text: `boxing ${strip}` },
          foam,
          deck,
        ],
        back: [...allowance, ...closed],
      };
    case 'knife-edge':
      return {
        front: [
          { at: 'top', text: 'plate' },
          { ...welt, text: make.welt === 'none' ? 'one seam' : 'welt, one seam' },
          ...inFront,
          foam,
          deck,
        ],
        back: closed,
      };
    case 'waterfall':
      return {
        front: [
          { at: 'top', text: 'one piece over the front' },
          { at: 'middle', text: `front ${strip}` },
          foam,
          deck,
        ],
        back: [...allowance, ...closed],
      };
    case 'bullnose':
      return {
        front: [
          { at: 'top', text: 'one piece over the front' },
          { at: 'middle', text: `half round, R ${show(spec.finishedMm.thicknessMm / 2)}` },
          foam,
          deck,
        ],
        back: [...allowance, ...closed],
      };
    case 'plywood-backed':
      return {
        front: [{ at: 'top', text: 'cover pulled round' }, foam, { at: 'board', text: 'board' }, deck],
        back: [{ at: 'staples', text: 'stapled under' }],
      };
  }
}
