import type { Fault } from '../planning/fault.ts';
import { checkConfiguration } from './aeroplane-checks/check-configuration.ts';
import { checkCounts, mostConfigurations } from './aeroplane-checks/check-counts.ts';
import { checkEngineOut } from './aeroplane-checks/check-engine-out.ts';
import { checkFit } from './aeroplane-checks/check-fit.ts';
import { checkFlightManual } from './aeroplane-checks/check-flight-manual.ts';
import { checkMasses } from './aeroplane-checks/check-masses.ts';
import { checkPowerplant } from './aeroplane-checks/check-powerplant.ts';
import { checkTables } from './aeroplane-checks/check-tables.ts';
import { checkWing, checkWingLoading } from './aeroplane-checks/check-wing.ts';
import type { AeroplaneDefinition } from './aeroplane-definition.ts';
import { perhaps } from './present.ts';
import { si } from './quantity.ts';
import { toCalibration } from './to-aeroplane.ts';

/**
 * What a definition says against itself or against what aeroplanes are.
 *
 * @param definition - read by its schema
 * @param at - pointer to the definition in the request
 * @returns every fault; none for a definition that toAeroplane may have
 */
export function checkAeroplane(definition: AeroplaneDefinition, at: string): Fault[] {
  const ids = Object.keys(definition.configurations);
  const tables = checkTables(definition, at);
  const loading = checkWingLoading(definition, at);
  const wingArea = loading.length > 0 ? undefined : si('area', definition.wing.area);
  const calibration = tables.some(({ pointer }) => pointer.startsWith(`${at}/airspeedCalibration`))
    ? 'at-fault'
    : perhaps(toCalibration, definition.airspeedCalibration);
  return [
    ...checkCounts(definition, at),
    ...checkMasses(definition, at),
    ...checkEngineOut(definition, at),
    ...(wingArea === undefined ? loading : checkWing(definition, at)),
    ...checkPowerplant(definition, at),
    ...tables,
    ...ids.slice(0, mostConfigurations).flatMap((id) => checkConfiguration(id, definition, wingArea, calibration, at)),
    ...checkFlightManual(definition, calibration, at),
    ...checkFit(definition, at),
  ];
}
