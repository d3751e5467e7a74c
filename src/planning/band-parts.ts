import type { BandContribution } from './answer.ts';
import { type Band, widest } from './band.ts';

/** The two parts of a takeoff or landing distance [m]; one that is not finite does not exist. */
export interface Parts {
  readonly groundRoll: number;
  readonly airDistance: number;
}

/** A run that can be changed and set back, and what a cheap estimate says of it as it stands. */
export interface Movable {
  readonly estimate: () => Parts;
  readonly restore: () => void;
}

/** A tenth of a standard deviation: small enough for a slope, and an estimate near its end still exists. */
const step = 0.1;

/**
 * The parts of a 90 % band, linear in ln s, gathered one by one.
 *
 * Each input is moved by a tenth of its standard deviation, the estimate is taken again, and the change of ln s is scaled to one
 * standard deviation; the parts add as squares, with the model form of the method first. In the whole distance ground roll and air
 * distance move together.
 */
export class BandParts {
  readonly #movable: Movable;
  readonly #base: Parts;
  readonly #rollShare: number;
  readonly #form: number;
  readonly #contributions: BandContribution[] = [];

  /**
   * @param movable - the run as stated
   * @param result - its distances, which weigh roll against air distance
   * @param form - what the method itself may be off, as a share of each distance: the first part
   */
  constructor(movable: Movable, { groundRoll, airDistance }: Parts, form: number) {
    this.#movable = movable;
    this.#base = movable.estimate();
    this.#rollShare = groundRoll / (groundRoll + airDistance);
    this.#form = form;
    this.add('model form', this.#form, this.#form);
  }

  /** A part that is known: shares of the roll and of the air distance for one standard deviation. */
  add(of: string, groundRoll: number, airDistance: number): void {
    const wholeDistance = groundRoll * this.#rollShare + airDistance * (1 - this.#rollShare);
    this.#contributions.push({ of, groundRoll, airDistance, wholeDistance });
  }

  /**
   * A part by moving an input: better by a tenth of a standard deviation, or worse, since where one estimate does not exist the
   * other may. Where neither does, the model form stands in.
   *
   * @param change - moves the run by so many standard deviations to the worse
   */
  move(of: string, change: (by: number) => void): void {
    let groundRoll = Number.NaN;
    let airDistance = Number.NaN;
    for (const by of [-step, step]) {
      if (Number.isFinite(groundRoll) && Number.isFinite(airDistance)) break;
      change(by);
      const other = this.#movable.estimate();
      groundRoll = Math.log(other.groundRoll / this.#base.groundRoll) / by;
      airDistance = Math.log(other.airDistance / this.#base.airDistance) / by;
      this.#movable.restore();
    }
    this.add(
      of,
      Number.isFinite(groundRoll) ? groundRoll : this.#form,
      Number.isFinite(airDistance) ? airDistance : this.#form,
    );
  }

  band(): Band {
    return {
      groundRoll: together(this.#contributions, 'groundRoll'),
      airDistance: together(this.#contributions, 'airDistance'),
      wholeDistance: together(this.#contributions, 'wholeDistance'),
      contributions: this.#contributions,
    };
  }
}

function together(
  contributions: readonly BandContribution[],
  of: 'groundRoll' | 'airDistance' | 'wholeDistance',
): number {
  let squares = 0;
  for (const contribution of contributions) squares += contribution[of] ** 2;
  return Math.min(widest, Math.sqrt(squares));
}
