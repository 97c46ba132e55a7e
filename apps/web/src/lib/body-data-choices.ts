/** Surveys from which the measures of a person are predicted, as they are offered. */
export const BODY_DATA_CHOICES = [
  { value: 'mixed', words: 'Not said', detail: 'both surveys' },
  { value: 'women', words: 'Women' },
  { value: 'men', words: 'Men' },
] as const;
