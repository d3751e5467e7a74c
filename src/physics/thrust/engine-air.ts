/** What an engine sees of the air, in SI. */
export interface EngineAir {
  /** pressure altitude [m], -5000 to 20 000 */
  readonly pressureAltitude: number;
  /** [Pa] */
  readonly pressure: number;
  /** [K] */
  readonly temperature: number;
  /** of the air as it is, moisture included [kg/m3] */
  readonly density: number;
  /** [Pa]; absent where no dew point is known: then no power is taken off for moisture */
  readonly vapourPressure?: number;
}
