import type { Category } from '../aeroplane.ts';

const degree = Math.PI / 180;
/** How well a maximum lift coefficient is known, over itself. @see references.Judgement */
const known = 0.03;
/** Flap beyond which a takeoff setting is a landing's as well, and beyond which a landing's is full [rad]. @see references.Judgement */
const landingFlap = 20 * degree;
const fullFlap = 30 * degree;

/**
 * Usual maximum lift coefficients of the whole aeroplane, trimmed and power off.
 *
 * Light aeroplanes 1.3 to 1.6 without flap, up to 1.8 with takeoff flap, 1.8 to 2.2 (twins 1.9 to 2.4) with landing flap;
 * turboprops up to 2.8 and jets 1.8 to 2.4 on takeoff, up to 3.2 on landing; a small or a great flap setting has the range of its
 * neighbour too, and each range 3 % on both sides.
 *
 * @param category - of the aeroplane
 * @param phase - what the configuration is for
 * @param flap - [rad]
 * @see references.HouseFit
 */
export function maximumLiftRange(
  category: Category,
  phase: 'takeoff' | 'landing',
  flap: number,
): readonly [number, number] {
  const [low, high] = usual(category, phase, flap);
  return [low * (1 - known), high * (1 + known)];
}

function usual(category: Category, phase: 'takeoff' | 'landing', flap: number): readonly [number, number] {
  const isJet = category.endsWith('jet');
  const isTurboprop = category.endsWith('turboprop');
  const landingHigh = isJet ? 3.2 : isTurboprop ? 2.8 : category.startsWith('twin') ? 2.4 : 2.2;
  if (flap <= 0) return [1.3, isJet ? 1.8 : 1.6];
  if (phase === 'takeoff') return [1.3, flap > landingFlap ? landingHigh : isJet ? 2.4 : isTurboprop ? 2.2 : 1.8];
  return [flap > fullFlap ? 1.8 : 1.5, landingHigh];
}
