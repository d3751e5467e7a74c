import type { BandedDistance, ManualUse } from '../answer.ts';
import type { Worksheet } from './worksheet.ts';

const distance = { kind: 'distance', direction: 'up' } as const;

/**
 * The distances of an answer by the flight manual: what its sheets and notes give, and the ratios of physics that carry it further.
 *
 * @param whole - symbol and name of the whole distance: 's_T' and 'takeoff distance'
 */
export function manualLines(
  sheet: Worksheet,
  { document, figures, silences }: ManualUse,
  distances: { readonly groundRoll: BandedDistance; readonly airDistance: BandedDistance },
  whole: { readonly symbol: string; readonly name: string; readonly value: number },
): void {
  sheet.begin('flight-manual');
  const roll = {
    symbol: 's_G_asked',
    name: 'ground roll',
    value: distances.groundRoll.value,
    unit: 'm',
    shownAs: distance,
  } as const;
  const air = {
    symbol: 's_A_asked',
    name: 'air distance',
    value: distances.airDistance.value,
    unit: 'm',
    shownAs: distance,
  } as const;
  const { groundRoll, wholeDistance } = figures;
  const pages = figures.sheets.map(({ id, page }) => `${id}, page ${page}`).join('; ');
  if (groundRoll === undefined || wholeDistance === undefined) {
    sheet.figure('table', {
      ...roll,
      name: `${roll.name} by ${document} (${pages}) and physics`,
      source: 'HouseManual',
    });
    sheet.figure('table', { ...air, name: `${air.name} by ${document} (${pages}) and physics`, source: 'HouseManual' });
  } else {
    const printed = { unit: 'm', source: 'HouseManual' } as const;
    const notes =
      figures.notes.length === 0 ? 'no note' : figures.notes.map(({ note }) => note.text ?? note.about).join('; ');
    const from = `${document} (${pages}), ${notes} applied`;
    sheet.figure('table', { ...printed, symbol: 's_G_manual', name: `ground roll by ${from}`, value: groundRoll });
    sheet.figure('table', { ...printed, symbol: 's_manual', name: `${whole.name} by ${from}`, value: wholeDistance });
    const carried =
      silences.length === 0 ? undefined : `physics as asked over physics as the manual has it (${silences.join(', ')})`;
    if (carried !== undefined) {
      const ratio = { source: 'HouseManual' } as const;
      sheet.figure('integral', {
        ...ratio,
        symbol: 'k_G',
        name: `ground roll: ${carried}`,
        value: roll.value / groundRoll,
      });
      sheet.figure('integral', {
        ...ratio,
        symbol: 'k_A',
        name: `air distance: ${carried}`,
        value: air.value / (wholeDistance - groundRoll),
      });
    }
    sheet.formula({ ...roll, formula: carried === undefined ? 's_G_manual' : 's_G_manual*k_G', source: 'HouseManual' });
    sheet.formula({
      ...air,
      formula: carried === undefined ? 's_manual - s_G_manual' : '(s_manual - s_G_manual)*k_A',
      source: 'HouseManual',
    });
  }
  sheet.formula({ ...whole, formula: 's_G_asked + s_A_asked', unit: 'm', source: 'McCormick1995', shownAs: distance });
}
