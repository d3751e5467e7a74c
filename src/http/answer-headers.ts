/** Headers of every answer: it is of its type, and it is computed for this request alone. */
export const answerHeaders = {
  'cache-control': 'no-store',
  'x-content-type-options': 'nosniff',
} as const;
