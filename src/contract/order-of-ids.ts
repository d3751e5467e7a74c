import type { AeroplaneDefinition } from './aeroplane-definition.ts';

/**
 * A definition with its configurations, power settings and fits in the order of their ids: the order in which they are written
 * means nothing, and clients that sort members must get the same answer.
 *
 * @param definition - as its reader returns it, all other members in the schema's order
 */
export function orderOfIds(definition: AeroplaneDefinition): AeroplaneDefinition {
  const { configurations, propulsion, fit } = definition;
  const { powerSettings } = propulsion;
  return {
    ...definition,
    configurations: byId(configurations),
    propulsion: powerSettings === undefined ? propulsion : { ...propulsion, powerSettings: byId(powerSettings) },
    ...(fit === undefined
      ? {}
      : {
          fit: {
            ...(fit.takeoff === undefined ? {} : { takeoff: byId(fit.takeoff) }),
            ...(fit.landing === undefined ? {} : { landing: byId(fit.landing) }),
          },
        }),
  };
}

function byId<T>(record: Readonly<Record<string, T>>): Record<string, T> {
  return Object.fromEntries(
    Object.keys(record)
      .sort()
      .map((id) => [id, record[id] as T]),
  );
}
