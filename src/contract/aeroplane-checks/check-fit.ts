import type { Fault } from '../../planning/fault.ts';
import type { AeroplaneDefinition } from '../aeroplane-definition.ts';
import type { LandingFitOnWire, TakeoffFitOnWire } from '../fit/fit-member.ts';
import { si } from '../quantity.ts';
import { unknownId } from '../unknown-id.ts';
import { mostConfigurations } from './check-counts.ts';

/** The fits of a definition: of its configurations, with what its propulsion has, their tables of one size. */
export function checkFit({ fit, configurations, propulsion }: AeroplaneDefinition, at: string): Fault[] {
  if (fit === undefined) return [];
  const here = `${at}/fit`;
  const lapses = propulsion.kind === 'fixed-pitch' || propulsion.kind === 'constant-speed';
  return (['takeoff', 'landing'] as const).flatMap((phase) =>
    Object.entries(fit[phase] ?? {})
      .slice(0, mostConfigurations)
      .flatMap(([id, one]) => {
        const pointer = `${here}/${phase}/${id}`;
        const known = Object.hasOwn(configurations, id) ? configurations[id] : undefined;
        const faults: Fault[] = [...checkCorrelation(one, pointer), ...checkRanges(one, pointer)];
        if (known === undefined) {
          faults.push(unknownId(pointer, 'configuration', id, Object.keys(configurations)));
        } else if (!known.for.includes(phase)) {
          faults.push({
            pointer,
            code: 'contradiction',
            message: `${id} is not a configuration for ${phase}.`,
            received: id,
            allowed: `configurations whose for holds ${phase}`,
          });
        }
        for (const member of ['altitudeLapseCoefficient', 'temperatureExponent'] as const) {
          if (!lapses && member in one) {
            faults.push({
              pointer: `${pointer}/${member}`,
              code: 'contradiction',
              message: `A propulsion of kind ${propulsion.kind} has no ${member}.`,
              allowed: 'fixed-pitch or constant-speed',
            });
          }
        }
        return faults;
      }),
  );
}

/** As many rows and columns as standard deviations, 1 with itself, the same both ways. */
function checkCorrelation(
  { correlation, standardDeviations }: TakeoffFitOnWire | LandingFitOnWire,
  at: string,
): Fault[] {
  const n = Object.keys(standardDeviations).length;
  const lawful =
    correlation.length === n &&
    correlation.every(
      (row, j) => row.length === n && row[j] === 1 && row.every((value, k) => value === correlation[k]?.[j]),
    );
  if (lawful) return [];
  return [
    {
      pointer: `${at}/correlation`,
      code: 'contradiction',
      message: `The correlation is no symmetric table of ${n} by ${n} with 1 on its diagonal.`,
      allowed: 'one row and one column for each standard deviation',
    },
  ];
}

const kinds = { mass: 'mass', pressureAltitude: 'length', temperature: 'temperature' } as const;

/** Ranges of conditions that do not run upwards. */
function checkRanges({ conditions }: TakeoffFitOnWire | LandingFitOnWire, at: string): Fault[] {
  return Object.entries(kinds).flatMap(([axis, kind]): Fault[] => {
    const { from, to } = conditions[axis as keyof typeof kinds];
    if (si(kind, from as never) <= si(kind, to as never)) return [];
    return [
      {
        pointer: `${at}/conditions/${axis}/to`,
        code: 'contradiction',
        message: `The range of ${axis} ends below where it begins.`,
        received: to.value,
      },
    ];
  });
}
