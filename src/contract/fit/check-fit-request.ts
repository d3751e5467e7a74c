import type { Fault } from '../../planning/fault.ts';
import { checkColumns } from '../aeroplane-checks/check-columns.ts';
import { checkEntries, checkOutputs } from '../aeroplane-checks/check-manual-entries.ts';
import { isAxis, isOutput } from '../flight-manual/to-manual-table.ts';
import { checkGround } from '../question-checks/check-surface.ts';
import type { FitRequest, MeasuredRunOnWire } from './fit-request.ts';

/**
 * Tables and runs of a fit against themselves: what keeps them from being read at all. Whether their figures go together is for
 * the fit to say.
 */
export function checkFitRequest(request: FitRequest): Fault[] {
  const { tables = [], runs = [], free = [] } = request;
  return [
    ...tables.flatMap((table, i) => {
      const at = `/tables/${i}`;
      const names = table.columns.map(({ name }) => name);
      return [
        ...checkGround(table.conditions.surface, `${at}/conditions/surface`),
        ...checkColumns(table, at),
        ...checkEntries(names.filter(isAxis), table.conditions, `${at}/columns`, `${at}/conditions`),
        ...checkOutputs(names.filter(isOutput), request.for, `${at}/columns`),
        ...noSpeeds(names, at),
      ];
    }),
    ...runs.flatMap((run, i) => [
      ...checkGround(run.surface, `/runs/${i}/surface`),
      ...checkRun(run, request.for, `/runs/${i}`),
    ]),
    ...strangeParameters(free, request.for),
  ];
}

function noSpeeds(names: readonly string[], at: string): Fault[] {
  return names.flatMap((name, i): Fault[] =>
    name === 'liftOff' || name === 'screen' || name === 'landingReference'
      ? [
          {
            pointer: `${at}/columns/${i}`,
            code: 'contradiction',
            message: `A fit reads no ${name} from a table: the speeds are those of the configuration.`,
            received: name,
            hint: "Put it in the configuration's speeds.",
          },
        ]
      : [],
  );
}

/** A run has a distance, and none of the other phase; a marker has one speed. */
function checkRun(run: MeasuredRunOnWire, phase: FitRequest['for'], at: string): Fault[] {
  const faults: Fault[] = [];
  const { markers = [], heights = [] } = run;
  const strange =
    phase === 'takeoff' ? (['landingDistance'] as const) : (['takeoffDistance', 'markers', 'heights'] as const);
  for (const member of strange) {
    if (run[member] !== undefined) {
      faults.push({
        pointer: `${at}/${member}`,
        code: 'contradiction',
        message: `${member} is no figure of a fit of a ${phase}.`,
      });
    }
  }
  const whole = phase === 'takeoff' ? run.takeoffDistance : run.landingDistance;
  if (run.groundRoll === undefined && whole === undefined && markers.length + heights.length === 0) {
    faults.push({
      pointer: at,
      code: 'missing',
      message: 'The run has no distance.',
      allowed:
        phase === 'takeoff' ? 'groundRoll, takeoffDistance, markers or heights' : 'groundRoll or landingDistance',
    });
  }
  for (const [i, { groundSpeed, cas }] of markers.entries()) {
    if ((groundSpeed === undefined) !== (cas === undefined)) continue;
    faults.push({
      pointer: `${at}/markers/${i}`,
      code: 'exactly-one-of',
      message: 'A marker has one speed, over the ground or through the air.',
      allowed: 'exactly one of groundSpeed or cas',
    });
  }
  return faults;
}

const ofLanding = ['brakingFrictionCoefficient', 'approachAngle'];

function strangeParameters(free: NonNullable<FitRequest['free']>, phase: FitRequest['for']): Fault[] {
  return free.flatMap((name, i): Fault[] =>
    ofLanding.includes(name) === (phase === 'landing')
      ? []
      : [
          {
            pointer: `/free/${i}`,
            code: 'contradiction',
            message: `${name} is no parameter of a ${phase}.`,
            received: name,
          },
        ],
  );
}
