import type { Catalogue } from '../catalogue/read-catalogue.ts';
import type { Q } from '../contract/quantity.ts';

export interface TakeoffState {
  readonly aeroplane: { readonly id: string };
  readonly mass: Q;
  readonly configuration: string;
}

/** Each aeroplane on file at its greatest takeoff mass in its first takeoff configuration: what a warm-up asks of. */
export function takeoffStates(catalogue: Catalogue): TakeoffState[] {
  return catalogue.list().flatMap(({ definition: { id, masses, configurations } }) => {
    const first = Object.keys(configurations).find((name) => configurations[name]?.for.includes('takeoff'));
    return first === undefined ? [] : [{ aeroplane: { id }, mass: masses.maximumTakeoff, configuration: first }];
  });
}
