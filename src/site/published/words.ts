/** What a source is, in order of printing. */
export const SOURCE_KINDS = ['constants', 'results', 'paper', 'textbook', 'course page', 'practice'] as const;
export type SourceKind = (typeof SOURCE_KINDS)[number];

/** Heads over the sources of one kind. */
export const KIND_TITLE: Readonly<Record<SourceKind, string>> = {
  constants: 'Tables of constants',
  results: 'Results of surveys and satellites',
  paper: 'Papers with worked values',
  textbook: 'Textbooks',
  'course page': 'Course pages',
  practice: 'Common practice',
};

/** How a published value came here. */
export const STATUSES = [
  'seen in the source',
  'seen in the abstract',
  'quoted by another text',
  'worked out from its formula',
  'from memory',
  'common practice',
] as const;
export type Status = (typeof STATUSES)[number];

/** The same, as a page says it. */
export const STATUS_TEXT: Readonly<Record<Status, string>> = {
  'seen in the source': 'seen in the source',
  'seen in the abstract': 'seen in the abstract',
  'quoted by another text': 'as another text quotes it',
  'worked out from its formula': 'worked out here from its closed form',
  'from memory': 'from memory, not yet checked against the source',
  'common practice': 'common practice',
};

/** What limits a comparison. The first three can be computed from what the source prints, and a test does so. */
export const TOLERANCE_GROUNDS = [
  'printed digits',
  'input digits',
  'mean of chains',
  'round statement',
  'double precision',
] as const;
export type ToleranceGround = (typeof TOLERANCE_GROUNDS)[number];

/** The same, as a page says it, with the letter that stands for it beside a tolerance. */
export const GROUND_TEXT: Readonly<Record<ToleranceGround, { readonly letter: string; readonly text: string }>> = {
  'printed digits': { letter: 'a', text: 'half a unit of the last printed digit' },
  'input digits': { letter: 'b', text: 'what half a unit of the last digit of each input makes' },
  'mean of chains': {
    letter: 'c',
    text: 'the published value is a mean over a distribution, which differs from the value at the mean parameters',
  },
  'round statement': { letter: 'd', text: 'a round statement; the line gives the reason' },
  'double precision': { letter: 'e', text: 'an identity, limited by double precision' },
};
