import type { Fault } from '../planning/fault.ts';
import { checkConfiguration } from './aeroplane-checks/check-configuration.ts';
import { checkMasses } from './aeroplane-checks/check-masses.ts';
import { checkPowerplant } from './aeroplane-checks/check-powerplant.ts';
import { checkTables } from './aeroplane-checks/check-tables.ts';
import { checkWing } from './aeroplane-checks/check-wing.ts';
import type { AeroplaneDefinition } from './aeroplane-definition.ts';
import { toCalibration } from './to-aeroplane.ts';

/** So many configurations at most; our choice. */
export const mostConfigurations = 24;

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
  const count: Fault[] =
    ids.length >= 1 && ids.length <= mostConfigurations
      ? []
      : [
          {
            pointer: `${at}/configurations`,
            code: ids.length === 0 ? 'missing' : 'out-of-range',
            message: `${ids.length} configurations are given.`,
            received: ids.length,
            allowed: `1 to ${mostConfigurations} configurations`,
          },
        ];
  const usable =
    definition.airspeedCalibration !== undefined && tables.every((fault) => !fault.pointer.includes('Calibration'));
  const calibration = usable ? toCalibration(definition.airspeedCalibration as never) : undefined;
  const spoilt = definition.airspeedCalibration !== undefined && !usable;
  return [
    ...count,
    ...checkMasses(definition, at),
    ...checkWing(definition, at),
    ...checkPowerplant(definition, at),
    ...tables,
    ...(spoilt
      ? []
      : ids.slice(0, mostConfigurations).flatMap((id) => checkConfiguration(id, definition, calibration, at))),
  ];
}
