import type { BoardModule, PieceOf } from '../room/document.ts';

/** What a new seat starts with: 3 3/4 in of firm foam, 2.6 lb/ft³, 50 lbf at 25 %. */
export const FIRM_SEAT: PieceOf<'bench'>['seatCushion'] = {
  thicknessMm: 95.25,
  foam: { grade: 'firm seat', densityKgM3: 41.6, ifd25N: 222.4, supportFactor: 2.2 },
};

/** What a new back starts with: 2 in of softer foam. */
export const BACK_PAD: PieceOf<'bench'>['backCushion'] = {
  thicknessMm: 50.8,
  foam: { grade: 'soft back', densityKgM3: 28.8, ifd25N: 111.2, supportFactor: 2 },
};

/** Boards a new piece starts with: 3 1/8 in faces and 1/8 in reveals. */
export const BOARDS: BoardModule = { faceMm: 79.375, revealMm: 3.175 };
