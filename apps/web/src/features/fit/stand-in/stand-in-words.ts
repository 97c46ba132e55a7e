import {
  MEASURE_INFO,
  type PartDifference,
  type RuleUnit,
  type StandInCheck,
} from '@settlewright/anthropometry';
import { formatMass, type LengthStyle } from '@settlewright/geometry';
import { capital } from '@/lib/capital.ts';
import { amountText } from '../amounts.ts';
import { shortName } from '@/lib/short-name.ts';

/** Whom a sentence is about; without a name the one who tries is "the stand-in". */
export interface Pair {
  castMember: string;
  standIn?: string | undefined;
}

/** Units of the rule and the reader, and from which difference a sit says little. */
export interface Said {
  unit: RuleUnit;
  style: LengthStyle;
  littleSaidMm: number;
}

/** What one sit says of one check, in a sentence or two. */
export function standInWords(check: StandInCheck, pair: Pair, said: Said): string {
  const them = shortName(pair.castMember);
  const sitter = pair.standIn === undefined ? 'the stand-in' : shortName(pair.standIn);
  const side = sideWords(check, them, sitter);
  if (check.answer === 'cannotTell') return `this sit cannot tell. ${instead(check, them, sitter)}`.trim();
  if (check.saysLittle) return littleWords(check, them, sitter, said);
  if (check.answer === 'carriesOver') {
    const because = check.because === 'room' ? roomWords(check, said) : '';
    return `what ${sitter} finds holds for ${them}${because}.${side}`;
  }
  const misleads = check.misleads ? `by itself the sit misleads. ` : '';
  return `${misleads}${correction(check, them, sitter, said)}${side}`;
}

/** " because of the room there is, about 3″ or more for either, although their bodies differ here by about 1″". */
function roomWords({ room, difference }: StandInCheck, { unit, style }: Said): string {
  if (!room || !difference) return '';
  const { castMember, standIn } = room;
  const show = (value: number) => amountText(Math.abs(value), unit, style);
  const ground =
    castMember < 0 && standIn < 0
      ? `only because both are short of room, by about ${show(Math.max(castMember, standIn))} or more`
      : `because of the room there is, about ${show(Math.max(0, Math.min(castMember, standIn)))} or more for either`;
  return ` ${ground}, although their bodies differ here ${apartWords(difference, { unit, style })}`;
}

/** "by about 1⅜″ (1 to 1¾″)", "by up to 2″ either way". */
function apartWords(
  { best, low, high }: NonNullable<StandInCheck['difference']>,
  { unit, style }: Pick<Said, 'unit' | 'style'>,
): string {
  const show = (value: number) => amountText(Math.abs(value), unit, style);
  if (high - low < 1) return `by ${show(best)}`;
  if (low < 0 && high > 0) return `by up to ${show(Math.max(-low, high))}, either of them having more`;
  const [least, most] = [Math.abs(low), Math.abs(high)].sort((a, b) => a - b);
  return `by about ${show(best)} (${show(least as number)} to ${show(most as number)})`;
}

/** Bodies that differ too much: what is known then comes from the drawing, not from the sit. */
function littleWords(
  { difference, room }: StandInCheck,
  them: string,
  sitter: string,
  { unit, style, littleSaidMm }: Said,
): string {
  if (!difference || !room) return '';
  const show = (value: number) => amountText(Math.abs(value), unit, style);
  const drawn =
    room.castMember < 0
      ? `is about ${show(room.castMember)} short`
      : `has about ${show(room.castMember)} of room`;
  return (
    `the sit says little: ${sitter} and ${them} differ here ${apartWords(difference, { unit, style })}, ` +
    `more than the ${show(littleSaidMm)} up to which one body is taken for another (shop rule). ` +
    `By the drawing ${them} ${drawn}; only ${them} can try that.`
  );
}

function sideWords({ side }: StandInCheck, them: string, sitter: string): string {
  if (side === 'lessRoom') return ` Room enough for ${sitter} is enough for ${them}.`;
  if (side === 'moreRoom') return ` ${capital(sitter)} has more room here than ${them}.`;
  return '';
}

function instead({ take }: StandInCheck, them: string, sitter: string): string {
  if (!take) return '';
  const whose = take.of === 'castMember' ? them : sitter;
  if (take.key === 'weight_kg') return `Weigh ${whose} instead: the cushion decides.`;
  return `Tape ${whose}’s ${MEASURE_INFO[take.key].plain} instead.`;
}

/** "Add 2⅜″ (2 to 2¾) to the room that Joss measures, to get Hetty’s." */
function correction(
  { difference }: StandInCheck,
  them: string,
  sitter: string,
  { unit, style }: Said,
): string {
  if (!difference) return '';
  const { best, low, high } = difference;
  const show = (value: number) => amountText(value, unit, style);
  const [verb, joint] = best < 0 ? ['Take', 'off'] : ['Add', 'to'];
  const ends = [low, high].map((end) => (best < 0 ? -end : end)).sort((a, b) => a - b);
  const known = high - low < 1 ? '' : ` (${ends.map(show).join(' to ')})`;
  return `${verb} ${show(Math.abs(best))}${known} ${joint} the room that ${sitter} finds, to get ${them}’s.`;
}

/** "Knee height 2″ more (1½″ to 2½″)": what differs between the two bodies. */
export function partWords({ key, best, low, high }: PartDifference, style: LengthStyle): string {
  const { plain, unit } = MEASURE_INFO[key];
  const show = (value: number) => (unit === 'kg' ? formatMass(value, style) : amountText(value, 'mm', style));
  const signed = (value: number) => `${value < 0 ? '−' : '+'}${show(Math.abs(value))}`;
  const known = high - low < 0.5 ? '' : `, between ${signed(low)} and ${signed(high)}`;
  return `${plain} ${signed(best)}${known}`;
}
