/** Something that is said wherever a share is shown. */
export interface Caution {
  words: string;
  /** How far apart two surveys of alike people came out, at most, in points of a share. */
  upToPoints: number;
  source: string;
}

/**
 * What the range of a share leaves out.
 *
 * @source shares counted in the rows of ANSUR 1988 (1,774 men, 2,208 women), against ANSUR II (4,082 men, 1,986 women)
 */
export const SURVEY_CAUTION: Caution = {
  words:
    'About so many. The range is that of counting a sample; it leaves out how one survey differs from the next: the ' +
    'same benches, put to two surveys of one army 24 years apart, came out up to 15 points apart.',
  upToPoints: 15,
  source:
    'Counted in the rows of ANSUR 1988 and modelled on ANSUR II: of women, 50.9 and 65.5 in 100 have their elbow ' +
    'within 30 mm of a sill 250 mm over the seat; elbow rest was measured 10 to 14 mm lower in 1988',
};
