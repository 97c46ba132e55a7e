import type { Piece, SetDocument } from '@settlewright/geometry';
import type { KeptText } from '../common/kept-text';

/** The longest that the document's schema takes. */
const MAX = { name: 80, note: 2000, grade: 60, difference: 1000, by: 120 };

type Change = (text: string, max: number, where: string) => string;

/** The document with every text that people typed into it changed, each no longer than it may be. */
export function withTexts(
  document: SetDocument,
  change: (text: string, where: string) => string,
): SetDocument {
  const fitted: Change = (text, max, where) => {
    const changed = change(text, where);
    return changed === text ? text : changed.slice(0, max).trim();
  };
  return {
    ...document,
    pieces: document.pieces.map((piece) => changedPiece(piece, fitted)),
    knownDifferences: document.knownDifferences.map((one) => ({
      ...one,
      text: fitted(one.text, MAX.difference, 'known differences'),
      ...(one.reason === undefined
        ? {}
        : { reason: fitted(one.reason, MAX.difference, 'known differences') }),
      ...(one.by === undefined ? {} : { by: fitted(one.by, MAX.by, 'who said so of known differences') }),
    })),
  };
}

/** Every text that people typed into a document, with the place it stands at: "Dining car, draft, note on B1". */
export function textsOf(document: SetDocument, where: string): KeptText[] {
  const texts: KeptText[] = [];
  withTexts(document, (text, part) => {
    texts.push({ where: `${where}, ${part}`, text });
    return text;
  });
  return texts;
}

function changedPiece(piece: Piece, change: Change): Piece {
  const common = {
    name: change(piece.name, MAX.name, `name of ${piece.mark}`),
    note: change(piece.note, MAX.note, `note on ${piece.mark}`),
  };
  const foamOf = (cushion: Cushion): Cushion => ({
    ...cushion,
    foam: { ...cushion.foam, grade: change(cushion.foam.grade, MAX.grade, `foam of ${piece.mark}`) },
  });
  switch (piece.kind) {
    case 'bench':
      return {
        ...piece,
        ...common,
        seatCushion: foamOf(piece.seatCushion),
        backCushion: foamOf(piece.backCushion),
      };
    case 'loose-seat':
      return { ...piece, ...common, seatCushion: foamOf(piece.seatCushion) };
    default:
      return { ...piece, ...common };
  }
}

type Cushion = Extract<Piece, { kind: 'bench' }>['seatCushion'];
