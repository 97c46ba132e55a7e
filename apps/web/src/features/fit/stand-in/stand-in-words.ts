import {
  MEASURE_INFO,
  type PartDifference,
  type RuleUnit,
  type StandInCheck,
} from '@settlewright/anthropometry';
import { formatMass, type LengthStyle } from '@settlewright/geometry';
import { amountText } from '../amounts.ts';
import { shortName } from '@/lib/short-name.ts';

/** Whom a sentence is about; without a name the one who tries is "the stand-in". */
export interface Pair {
  castMember: string;
  standIn?: string | undefined;
}

const capital = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

/** What one sit says of one check, in a sentence or two. */
export function standInWords(check: StandInCheck, pair: Pair, unit: RuleUnit, style: LengthStyle): string {
  const them = shortName(pair.castMember);
  const sitter = pair.standIn === undefined ? 'the stand-in' : shortName(pair.standIn);
  if (check.answer === 'carriesOver') {
    return `what ${sitter} finds holds for ${them}.${sideWords(check, them, sitter)}`;
  }
  if (check.answer === 'cannotTell') return `this sit cannot tell. ${instead(check, them, sitter)}`.trim();
  const misleads = check.misleads ? `by itself the sit misleads. ` : '';
  return `${misleads}${correction(check, them, sitter, unit, style)}${sideWords(check, them, sitter)}`;
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
  unit: RuleUnit,
  style: LengthStyle,
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
