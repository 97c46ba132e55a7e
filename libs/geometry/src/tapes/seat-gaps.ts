import { atHeight, rise, type Measure } from './gap.ts';
import { kneeAside } from './seat-view.ts';

export const seatHeight: Measure = (view, _cell, outcome) => {
  const { frame, sitter, body } = view;
  if (body && body.pose.heelGapMm > 0.5) {
    const heel = body.pose.joints.leftHeel;
    return {
      from: atHeight(heel, 0),
      to: atHeight(heel, body.pose.heelGapMm),
      name: 'under heel',
      valueMm: body.pose.heelGapMm,
      describes: `floor to the sole of ${sitter}’s shoe, seat of ${view.situation.mark} pressed by ${sitter}`,
    };
  }
  return {
    from: atHeight(frame.frontMm, 0),
    to: atHeight(frame.frontMm, outcome.value),
    name: 'seat',
    valueMm: outcome.value,
    describes: `floor to the front edge of ${view.situation.mark}, pressed by ${sitter}`,
  };
};

export const seatDepth: Measure = (view, _cell, outcome) => {
  const { body, situation, sitter } = view;
  const depth = situation.effectiveDepthMm;
  if (!body) {
    return {
      from: view.at(0, view.seatHipMm, 0),
      to: view.at(0, view.seatHipMm, depth),
      name: 'depth',
      valueMm: outcome.value,
      describes: `face of the back of ${situation.mark} to its seat front`,
    };
  }
  const aside = kneeAside(body.figure);
  const knee = body.figure.BPL + view.slideMm;
  const height = view.seatFrontMm - 20;
  return {
    from: view.at(aside, height, depth),
    to: view.at(aside, height, knee),
    name: 'behind knee',
    valueMm: knee - depth,
    describes: `seat front of ${situation.mark} to the back of ${sitter}’s knee`,
  };
};

export const hipWidth: Measure = (view, _cell, outcome) => ({
  from: view.at(-outcome.value / 2, view.seatHipMm + 60, 60),
  to: view.at(outcome.value / 2, view.seatHipMm + 60, 60),
  name: 'place',
  valueMm: outcome.value,
  describes: `width of place ${view.frame.place} of ${view.situation.mark}, where ${view.sitter} sits`,
});

export const headroom: Measure = (view) => {
  const { overhead } = view.situation;
  if (!overhead || !view.body) return undefined;
  const crown = view.body.pose.joints.crown;
  const top = view.seatHipMm + view.body.figure.SH;
  return rise(
    atHeight(crown, top),
    overhead.undersideMm,
    'over head',
    `top of ${view.sitter}’s head, sitting upright, to the underside of ${overhead.mark}`,
  );
};

/** Before the seat, half way into where one stands up. */
const STANDS_BEFORE_MM = 150;

export const standingRoom: Measure = (view) => {
  const { overheadAhead, effectiveDepthMm, mark } = view.situation;
  if (!overheadAhead) return undefined;
  return rise(
    view.at(0, 0, effectiveDepthMm + STANDS_BEFORE_MM),
    overheadAhead.undersideMm,
    'to stand up in',
    `floor before ${mark}, where ${view.sitter} stands up, to the underside of ${overheadAhead.mark}`,
  );
};

export const backHeight: Measure = (view, _cell, outcome) => {
  const { backTopMm, mark } = view.situation;
  if (backTopMm === undefined) return undefined;
  const from = view.at(0, backTopMm - outcome.value, 0);
  return rise(from, backTopMm, 'back', `seat of ${mark}, pressed by ${view.sitter}, to the top of its back`);
};
