/** A roll as it is laid out for cutting: x across it, y along it from its start. */
export interface ClothRoll {
  /** Width that can be used, selvedges left out, millimetres. */
  usableWidthMm: number;
  /** Distance after which the pattern comes again; 0 where it does not. The pattern starts at the roll's corner. */
  repeatMm: { acrossMm: number; alongMm: number };
}

/** A flat panel to be cut, seam allowance included. */
export interface ClothPanel {
  id: string;
  /** Across the roll while its own up points up the roll. */
  widthMm: number;
  /** Along the roll while its own up points up the roll. */
  lengthMm: number;
  /** Whether its up points up the roll, across it (railroaded), or either way. */
  lies: 'up-roll' | 'railroad' | 'either';
  /** Point that has to fall on the start of a repeat, from its own lower left corner: across it, and up it. */
  controlMm?: { acrossMm: number; alongMm: number };
}

/** A panel on the roll. */
export interface PlacedPanel {
  id: string;
  /** Lower left corner on the roll. */
  xMm: number;
  yMm: number;
  /** Size as it lies. */
  widthMm: number;
  lengthMm: number;
  /** True when its own up points across the roll. */
  railroaded: boolean;
}

/** Panels laid on a roll. */
export interface ClothLayout {
  placed: PlacedPanel[];
  /** Roll taken up, from its start to the last edge. */
  lengthMm: number;
  /** No layout of these panels is shorter. */
  boundMm: number;
}

/** One way in which a panel may lie. */
export interface PanelWay {
  widthMm: number;
  lengthMm: number;
  railroaded: boolean;
  /** The panel's control point as it lies. */
  controlMm?: { acrossMm: number; alongMm: number };
}

/**
 * The ways in which a panel may lie on a roll.
 *
 * @param panel - the panel
 * @param usableWidthMm - width of the roll; ways that are wider are left out
 * @returns one or two ways, none when the panel fits the roll in no way that is allowed
 */
export function waysOf(panel: ClothPanel, usableWidthMm: number): PanelWay[] {
  const { widthMm, lengthMm, lies, controlMm } = panel;
  const up: PanelWay = { widthMm, lengthMm, railroaded: false, ...(controlMm && { controlMm }) };
  const across: PanelWay = {
    widthMm: lengthMm,
    lengthMm: widthMm,
    railroaded: true,
    ...(controlMm && { controlMm: { acrossMm: controlMm.alongMm, alongMm: controlMm.acrossMm } }),
  };
  const ways = lies === 'up-roll' ? [up] : lies === 'railroad' ? [across] : [up, across];
  const fitting = ways.filter((way) => way.widthMm <= usableWidthMm + 1e-6);
  // A plain square needs no second try.
  return fitting.length === 2 && !controlMm && Math.abs(widthMm - lengthMm) < 1e-6 ? [up] : fitting;
}
