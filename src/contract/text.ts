import { z } from 'zod';

/** Ids of aeroplanes, configurations and rule sets: they are looked up, never used as a path. */
export const id = z
  .string()
  .max(64)
  .regex(/^[a-z0-9][a-z0-9-]{0,63}$/);

/** A reason in a sentence or two, on one line: no control characters, no half of a surrogate pair. */
export const reason = z
  .string()
  .min(1)
  .max(200)
  .regex(/^[^\p{Cc}\p{Cs}]*$/u);

/** Free text of at most 64 characters on one line: no control characters, no half of a surrogate pair. */
export const shortText = z
  .string()
  .min(1)
  .max(64)
  .regex(/^[^\p{Cc}\p{Cs}]*$/u);
