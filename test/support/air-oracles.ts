/** Curves the product does not use, written from their own papers, to judge those it does. */

/**
 * Density of moist air after Picard et al., CIPM-2007, Metrologia 45 (2008) 149, eqs. 1-4 and A1.1, xCO2 = 400e-6.
 *
 * @param celsius - 15 to 27 as published; used here to 40 for comparison
 * @param pressure - [Pa], 60 000 to 110 000
 * @param humidity - relative, 0 to 1
 */
export function cipm2007Density(celsius: number, pressure: number, humidity: number): number {
  const kelvin = celsius + 273.15;
  const saturation = Math.exp(1.2378847e-5 * kelvin ** 2 - 1.9121316e-2 * kelvin + 33.93711047 - 6.3431645e3 / kelvin);
  const enhancement = 1.00062 + 3.14e-8 * pressure + 5.6e-7 * celsius ** 2;
  const share = (humidity * enhancement * saturation) / pressure;
  const first =
    1.58123e-6 -
    2.9331e-8 * celsius +
    1.1043e-10 * celsius ** 2 +
    (5.707e-6 - 2.051e-8 * celsius) * share +
    (1.9898e-4 - 2.376e-6 * celsius) * share ** 2;
  const ratio = pressure / kelvin;
  const compressibility = 1 - ratio * first + ratio ** 2 * (1.83e-11 - 0.765e-8 * share ** 2);
  const dryMass = 28.96546e-3;
  return ((pressure * dryMass) / (compressibility * 8.314472 * kelvin)) * (1 - share * (1 - 18.01528e-3 / dryMass));
}

/** Saturation vapour pressure [hPa] after Buck 1981, J. Appl. Meteor. 20:1527, eq. (8), no enhancement factor. */
export function buck1981(celsius: number): number {
  return 6.1121 * Math.exp((17.502 * celsius) / (240.97 + celsius));
}
