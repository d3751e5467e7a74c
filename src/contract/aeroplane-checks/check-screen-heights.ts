import type { Fault } from '../../planning/fault.ts';
import { landingScreenHeight } from '../../planning/rules/landing-defaults.ts';
import type { AeroplaneDefinition } from '../aeroplane-definition.ts';
import type { FlightManualOnWire } from '../flight-manual/flight-manual.ts';
import { si } from '../quantity.ts';
import { written } from '../written.ts';
import { enteredSheets } from './entered-sheet.ts';

/** Heights nearer to each other than this are one: 50 ft and 15 m are both printed for it [m]; our choice. */
const sameHeight = 0.3;

/**
 * Sheets whose whole distance ends at a lower screen than the answer says: their figures are too short for it.
 *
 * A distance to a higher screen is the longer and stands.
 */
export function checkScreenHeights(
  { screenHeight: certified }: AeroplaneDefinition['certification'],
  manual: FlightManualOnWire,
  at: string,
): Fault[] {
  return enteredSheets(manual, at).flatMap(({ sheet, outputs, pointer }): Fault[] => {
    const own = sheet.conditions.screenHeight;
    const whole = outputs.find((output) => output === 'takeoffDistance' || output === 'landingDistance');
    if (own === undefined || whole === undefined) return [];
    const isTakeoff = whole === 'takeoffDistance';
    const screen = isTakeoff ? si('length', certified) : landingScreenHeight;
    if (si('length', own) >= screen - sameHeight) return [];
    const name = isTakeoff ? written(certified) : '50 ft';
    return [
      {
        pointer: `${pointer}/conditions/screenHeight`,
        code: 'contradiction',
        message: `The ${whole} is over a screen of ${written(own)}; that of this aeroplane is ${name}, and the distance is longer.`,
        received: own.value,
        allowed: `${name} or more`,
      },
    ];
  });
}
