import type { Fault } from '../../planning/fault.ts';
import type { AeroplaneDefinition } from '../aeroplane-definition.ts';
import { unknownId } from '../unknown-id.ts';

/** What the definition says of one engine out, against the rest of it. */
export function checkEngineOut({ configurations, engineOut }: AeroplaneDefinition, at: string): Fault[] {
  const approach = engineOut?.approach?.configuration;
  if (approach === undefined || Object.hasOwn(configurations, approach)) return [];
  return [unknownId(`${at}/engineOut/approach/configuration`, 'configuration', approach, Object.keys(configurations))];
}
