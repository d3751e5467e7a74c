import { figures } from './figures.ts';

const program = {
  source: 'independent program in another language, written from the same formulas',
  section: 'air: 1600 m, QNH 1010 hPa, 32 °C, dew point 12 °C',
  status: 'computed',
} as const;
interface Weather {
  readonly elevation_m: number;
  readonly qnh_hPa: number;
  readonly temperature_C: number;
  readonly dew_point_C: number | undefined;
}

const hotAndHigh: Weather = { elevation_m: 1600, qnh_hPa: 1010, temperature_C: 32, dew_point_C: 12 };
const standardDay: Weather = { elevation_m: 0, qnh_hPa: 1013.25, temperature_C: 15, dew_point_C: undefined };

export const densities = figures({ ...program, quantity: 'density', unit: 'kg/m3' }, [
  { id: 'hot-high density', inputs: hotAndHigh, expected: 0.9443140278667532, tolerance: 1e-9 },
  { id: 'sea-level density', inputs: standardDay, expected: 1.225000018124288, tolerance: 1e-9 },
]);

export const pressureAltitudes = figures({ ...program, quantity: 'pressure altitude', unit: 'm' }, [
  { id: 'hot-high pressure altitude', inputs: hotAndHigh, expected: 1627.0888955333958, tolerance: 1e-6 },
  { id: 'sea-level pressure altitude', inputs: standardDay, expected: 0, tolerance: 1e-6 },
]);

export const densityAltitudes = figures({ ...program, quantity: 'density altitude', unit: 'm' }, [
  { id: 'hot-high density altitude', inputs: hotAndHigh, expected: 2629.5119480847284, tolerance: 1e-6 },
  { id: 'sea-level density altitude', inputs: standardDay, expected: -0.00015411352625342817, tolerance: 1e-6 },
]);

/** True airspeed of the 1-g stall in the two airs, printed to 10 digits. */
export const stallSpeeds = figures({ ...program, quantity: 'stall speed, TAS', unit: 'm/s' }, [
  row('fixed-pitch/sea-level', 1043, 16.2, 1.6, 1.225000018124288, 25.38235674),
  row('fixed-pitch/hot-high', 1043, 16.2, 1.6, 0.9443140278667532, 28.90957923),
  row('constant-speed/sea-level', 1542, 16.5, 1.75, 1.225000018124288, 29.24074803),
  row('constant-speed/hot-high', 1542, 16.5, 1.75, 0.9443140278667532, 33.30414628),
  row('jet/sea-level', 70_000, 122.4, 2, 1.225000018124288, 67.66289904),
  row('jet/hot-high', 70_000, 122.4, 2, 0.9443140278667532, 77.06557592),
  row('landing', 1043, 16.2, 1.9, 1.225000018124288, 23.292448),
]);

function row(id: string, mass: number, area: number, lift: number, density: number, expected: number) {
  return {
    id: `${id} stall`,
    inputs: { mass_kg: mass, wing_area_m2: area, maximum_lift: lift, density_kg_m3: density },
    expected,
    tolerance: 1e-8,
  };
}
