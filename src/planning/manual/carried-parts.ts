import type { ManualFigures } from '../../performance/flight-manual/manual-figures.ts';
import type { Parts } from '../band-parts.ts';

/**
 * The manual's figures carried to what it does not speak of, by the ratio of two runs of the same physics: ground roll and air
 * distance each by its own, so that nothing jumps where what is not spoken of goes to nothing.
 *
 * A part that the manual does not print is the physics' own: without a ground roll it is the share that physics gives it of the
 * whole; without a whole distance the air distance is that of physics.
 *
 * @param figures - ground roll and whole distance [m], at least one of the two
 * @param asManual - physics under what the manual speaks of [m]
 * @param asked - physics under what is asked [m]
 * @returns ground roll and air distance [m]
 */
export function carriedParts(
  { groundRoll, wholeDistance }: Pick<ManualFigures, 'groundRoll' | 'wholeDistance'>,
  asManual: Parts,
  asked: Parts,
): Parts {
  if (groundRoll !== undefined) {
    return {
      groundRoll: (groundRoll * asked.groundRoll) / asManual.groundRoll,
      airDistance:
        wholeDistance === undefined
          ? asked.airDistance
          : ((wholeDistance - groundRoll) * asked.airDistance) / asManual.airDistance,
    };
  }
  if (wholeDistance === undefined) throw new RangeError('figures must hold a distance');
  const share = wholeDistance / (asManual.groundRoll + asManual.airDistance);
  return { groundRoll: share * asked.groundRoll, airDistance: share * asked.airDistance };
}
