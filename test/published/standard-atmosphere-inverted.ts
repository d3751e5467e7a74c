import { figures } from './figures.ts';

/** Pressure altitude less elevation for a QNH. */
export const qnhCorrections = figures(
  {
    source: 'ISO 2533 troposphere formula (altimeter law)',
    section: '2.7 formula (12), inverted',
    status: 'computed',
    quantity: 'pressure altitude minus elevation for a QNH',
    unit: 'ft',
    note: 'exact ISA: PA = elevation + 145442.156*(1-(QNH/1013.25)^0.190263); elevation-independent',
  },
  [
    { id: 'pa-qnh-950', inputs: { qnh_hPa: 950, elevation_ft: 0 }, expected: 1772.8, tolerance: 0.1 },
    { id: 'pa-qnh-970', inputs: { qnh_hPa: 970, elevation_ft: 0 }, expected: 1202.1, tolerance: 0.1 },
    { id: 'pa-qnh-980', inputs: { qnh_hPa: 980, elevation_ft: 0 }, expected: 920.4, tolerance: 0.1 },
    { id: 'pa-qnh-990', inputs: { qnh_hPa: 990, elevation_ft: 0 }, expected: 640.9, tolerance: 0.1 },
    { id: 'pa-qnh-1000', inputs: { qnh_hPa: 1000, elevation_ft: 0 }, expected: 363.8, tolerance: 0.1 },
    { id: 'pa-qnh-1003', inputs: { qnh_hPa: 1003, elevation_ft: 0 }, expected: 281.1, tolerance: 0.1 },
    { id: 'pa-qnh-1010', inputs: { qnh_hPa: 1010, elevation_ft: 0 }, expected: 88.9, tolerance: 0.1 },
    { id: 'pa-qnh-1030', inputs: { qnh_hPa: 1030, elevation_ft: 0 }, expected: -454.4, tolerance: 0.1 },
    { id: 'pa-qnh-1040', inputs: { qnh_hPa: 1040, elevation_ft: 0 }, expected: -722.9, tolerance: 0.1 },
    { id: 'pa-qnh-1050', inputs: { qnh_hPa: 1050, elevation_ft: 0 }, expected: -989.2, tolerance: 0.1 },
  ],
);

/** Density altitude of dry air by pressure altitude and temperature. */
export const dryDensityAltitudes = figures(
  {
    source: 'ISO 2533 density formula',
    section: '2.8 formula (14), inverted',
    status: 'computed',
    quantity: 'density altitude, dry air',
    unit: 'ft',
    note: 'DA = 145442.156*(1-sigma^0.234969)',
  },
  [
    { id: 'da-dry-0-30', inputs: { pressure_altitude_ft: 0, oat_C: 30 }, expected: 1724.0, tolerance: 1 },
    { id: 'da-dry-0--20', inputs: { pressure_altitude_ft: 0, oat_C: -20 }, expected: -4494.0, tolerance: 1 },
    { id: 'da-dry-2000-30', inputs: { pressure_altitude_ft: 2000, oat_C: 30 }, expected: 4161.0, tolerance: 1 },
    { id: 'da-dry-5000-30', inputs: { pressure_altitude_ft: 5000, oat_C: 30 }, expected: 7801.0, tolerance: 1 },
    { id: 'da-dry-10000-20', inputs: { pressure_altitude_ft: 10000, oat_C: 20 }, expected: 12785.0, tolerance: 1 },
  ],
);
