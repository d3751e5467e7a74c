import { z } from 'zod';

/** Ids of aeroplanes, configurations and rule sets: they are looked up, never used as a path. */
export const id = z
  .string()
  .max(64)
  .regex(/^[a-z0-9][a-z0-9-]{0,63}$/);

/** Text on one line of at most so many characters: no control characters, no half of a surrogate pair. */
export function text(most: number) {
  return z
    .string()
    .min(1)
    .max(most)
    .regex(/^[^\p{Cc}\p{Cs}]*$/u);
}

/** A reason in a sentence or two. */
export const reason = text(200);

/** Free text. */
export const shortText = text(64);
