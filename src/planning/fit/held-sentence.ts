import type { Held } from '../../performance/fit/shown-parameters.ts';
import { parameterText, parameterValueText } from './finding-sentence.ts';

const reasons: Readonly<Record<Held, string>> = {
  'not-asked': 'it was not to be freed',
  'one-altitude': 'distances of one pressure altitude do not show it',
  'one-temperature': 'distances of one temperature do not show it',
  'no-whole-distance': 'without distances to or from the screen nothing shows it',
  'no-ground-roll': 'without ground rolls nothing shows it',
};

/** Why a parameter was held, and where: 'The fall of power with altitude is held at 0.18: ...'. */
export function heldSentence(parameter: string, value: number, held: Held): string {
  const text = `${parameterText(parameter)} is held at ${parameterValueText(parameter, value)}: ${reasons[held]}.`;
  return text.charAt(0).toUpperCase() + text.slice(1);
}
