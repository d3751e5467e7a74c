import type { FindingTest } from './finding-test.ts';

/** Speeds that go with the table only in another unit. */
export const stallSpeedInOtherUnit: FindingTest = {
  code: 'stall-speed-in-other-unit',
  severity: 'strong',
  meaning:
    'The distances of a table go with the stall speed and the other calibrated speeds of the configuration only if these are in another unit.',
  source: 'HouseFit',
  test: ({ compared }) =>
    compared.flatMap(({ slips, configuration, table }) =>
      slips.flatMap((finding) => {
        if (finding.code !== 'stall-speed-unit' || finding.printed === undefined) return [];
        const { printed, declared, coefficient } = finding;
        return [
          {
            message: `The stall speed of ${configuration} in ${declared} is a maximum lift coefficient of ${coefficient.toFixed(2)} and does not go with ${table.id}; in ${printed} it does.`,
            at: `/configurations/${configuration}/maximumLift/stallSpeed/unit`,
            value: coefficient,
            hint: `Perhaps ${printed}.`,
          },
        ];
      }),
    ),
};
