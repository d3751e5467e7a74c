import type { z } from 'zod';
import type { ManualUse, OtherMethod } from '../planning/answer.ts';
import { manualMeasures } from '../planning/manual/manual-bound-text.ts';
import { outsideManualShortfalls } from '../planning/manual/outside-manual-shortfalls.ts';
import type { manualUse } from './manual-use.ts';
import type { Draft } from './present.ts';
import { type Presentation, shownQuantity, shownRatio } from './shown-quantity.ts';
import { toShortfall } from './to-shortfall.ts';

type Shown = z.infer<typeof manualUse>;

/** What an answer took from the flight manual, in the asked units. */
export function toManualUse(how: Presentation, { document, revision, figures, silences }: ManualUse): Shown {
  const { groundRoll, wholeDistance, sheets, notes, edges } = figures;
  const shown = { document, revision, tables: sheets.map(({ id, page }) => ({ id, page })) } as Draft<Shown>;
  if (groundRoll !== undefined) shown.groundRoll = shownQuantity(how, 'distance', groundRoll, 'up');
  if (wholeDistance !== undefined) shown.wholeDistance = shownQuantity(how, 'distance', wholeDistance, 'up');
  shown.notes = notes.map(({ sheet, note, given, factor }) => {
    const one = { table: sheet, about: note.about } as Draft<Shown['notes'][number]>;
    if (note.text !== undefined) one.text = note.text;
    if (given !== undefined) one.given = shownQuantity(how, manualMeasures[note.about].kind, given);
    one.factor = shownRatio(how, factor);
    return one;
  });
  shown.notSpokenOf = [...silences];
  shown.edges = outsideManualShortfalls({ bounds: edges }).map((edge) => toShortfall(how, edge));
  return shown;
}

/** The distance by the method that was not taken. */
export function toOtherMethod(how: Presentation, { method, distance, ratio }: OtherMethod) {
  return { method, distance: shownQuantity(how, 'distance', distance, 'up'), ratio: shownRatio(how, ratio) };
}
