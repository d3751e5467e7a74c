import type { Propulsion } from './aeroplane.ts';

/**
 * The propulsion at a setting below full power.
 *
 * Static thrust and measured thrust go with the ratio; shaft power goes with the ratio, and a known static thrust that caps it
 * with the ratio to the power 2/3, as an actuator disc's does.
 *
 * @param propulsion - at full power
 * @param fullPowerRatio - above 0, at most 1
 * @see references.GudmundssonGa for static thrust and power
 */
export function propulsionAtSetting(propulsion: Propulsion, fullPowerRatio: number): Propulsion {
  if (fullPowerRatio === 1) return propulsion;
  if (!(fullPowerRatio > 0 && fullPowerRatio <= 1)) {
    throw new RangeError(`fullPowerRatio must be above 0 and at most 1: ${fullPowerRatio}`);
  }
  switch (propulsion.kind) {
    case 'fixed-pitch':
    case 'jet':
      return { ...propulsion, staticThrust: propulsion.staticThrust * fullPowerRatio };
    case 'measured':
      return { ...propulsion, thrusts: propulsion.thrusts.map((thrust) => thrust * fullPowerRatio) };
    case 'constant-speed':
    case 'turboprop':
    case 'electric': {
      const { power, staticThrust } = propulsion;
      const reduced = { ...propulsion, power: power * fullPowerRatio };
      return staticThrust === undefined
        ? reduced
        : { ...reduced, staticThrust: staticThrust * fullPowerRatio ** (2 / 3) };
    }
  }
}
