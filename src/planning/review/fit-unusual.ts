import type { FindingTest } from './finding-test.ts';

/** What the parameters of a fit are, in words. */
const names: Readonly<Record<string, string>> = {
  thrustFactor: 'a thrust factor',
  airDragShift: 'a shift of the drag coefficient in the air',
  altitudeLapseCoefficient: 'an altitude lapse coefficient',
  temperatureExponent: 'a temperature exponent',
  brakingFrictionCoefficient: 'a braking friction coefficient',
  approachAngle: 'an approach angle in rad',
};

/** Physics follows a table only with figures that no such aeroplane has. */
export const fitUnusual: FindingTest = {
  code: 'fit-unusual',
  severity: 'caution',
  meaning:
    "The aeroplane's physics follows a table only with thrust, drag, lapse, braking or approach outside what such aeroplanes have: another page, unit or aeroplane, or a note left out.",
  source: 'HouseFit',
  test: ({ compared }) =>
    compared.flatMap(({ slips, table, configuration, at }) =>
      slips.flatMap((finding) => {
        if (finding.code !== 'parameter-at-bound' && finding.code !== 'parameter-implausible') return [];
        const { parameter, value, range } = finding;
        const [low, high] = range.map((bound) => Number(bound.toPrecision(3)));
        return [
          {
            message: `Physics of ${configuration} follows ${table.id} only with ${names[parameter] ?? parameter} of ${Number(value.toPrecision(3))}${finding.code === 'parameter-at-bound' ? ', the end of what is tried' : ''}; such aeroplanes have ${low} to ${high}.`,
            at,
            value,
            threshold: value <= range[0] ? range[0] : range[1],
            hint: 'Check units, page and power, and whether the figures hold a factor, a wind allowance or a surface.',
          },
        ];
      }),
    ),
};
