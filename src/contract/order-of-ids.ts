import type { AeroplaneDefinition } from './aeroplane-definition.ts';

/**
 * A definition with its configurations and its power settings in the order of their ids: the order in which they are written
 * means nothing, and clients that sort members must get the same answer.
 *
 * @param definition - as its reader returns it, all other members in the schema's order
 */
export function orderOfIds(definition: AeroplaneDefinition): AeroplaneDefinition {
  const { configurations, propulsion } = definition;
  const { powerSettings } = propulsion;
  return {
    ...definition,
    configurations: byId(configurations),
    propulsion: powerSettings === undefined ? propulsion : { ...propulsion, powerSettings: byId(powerSettings) },
  };
}

function byId<T>(record: Readonly<Record<string, T>>): Record<string, T> {
  return Object.fromEntries(
    Object.keys(record)
      .sort()
      .map((id) => [id, record[id] as T]),
  );
}
