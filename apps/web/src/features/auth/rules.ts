/** Rules of the entrance forms, in the words that stand under the fields. */
export const EMAIL_RULES = {
  required: 'Type your e-mail address.',
  pattern: {
    value: /^[^\s@]+@[^\s@]+\.[^\s@]+$/,
    message: 'An e-mail address looks like name@workshop.example.',
  },
} as const;

export const SHORTEST_PASSWORD = 10;

export const NEW_PASSWORD_RULES = {
  required: 'Choose a password.',
  minLength: {
    value: SHORTEST_PASSWORD,
    message: `A password has at least ${SHORTEST_PASSWORD} characters; three or four words in a row are easy to keep.`,
  },
} as const;
