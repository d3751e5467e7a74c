/** The part of the psychrometric library that serves as a second opinion; SI after SetUnitSystem(SI): degC, Pa, m. */
declare module 'psychrolib' {
  interface Psychrometrics {
    readonly SI: number;
    SetUnitSystem(system: number): void;
    GetSatVapPres(temperature: number): number;
    GetRelHumFromTDewPoint(temperature: number, dewPoint: number): number;
    GetTDewPointFromVapPres(temperature: number, vapourPressure: number): number;
    GetHumRatioFromVapPres(vapourPressure: number, pressure: number): number;
    GetMoistAirDensity(temperature: number, humidityRatio: number, pressure: number): number;
    GetStandardAtmPressure(altitude: number): number;
    GetStandardAtmTemperature(altitude: number): number;
  }
  const psychrolib: Psychrometrics;
  export default psychrolib;
}
