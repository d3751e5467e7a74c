import type { ReferenceKey } from '../../../references.ts';
import type { Factor } from '../../answer.ts';
import { isTransport } from '../named-aeroplanes.ts';
import type { Asked, Reading, Requirement } from '../rule-set.ts';

const transport: Factor = {
  code: 'overall',
  value: 1.15,
  because: '115 % of the distance with all engines running, the other of two of which the greater counts',
  source: 'Cfr25s113',
  status: 'read',
};
const commuter: Factor = { ...transport, source: 'Cfr23s59', status: 'memory' };

/** Distances of which the greater counts, one with all engines running and one with an engine failure. */
function both(
  code: string,
  against: Requirement['against'],
  [allEngines, engineOut]: readonly [Requirement['of'], Requirement['of']],
  factor: Factor,
  source: ReferenceKey,
): readonly Requirement[] {
  return [
    { code: `${code}-all-engines`, of: allEngines, against, factor, source },
    { code: `${code}-engine-out`, of: engineOut, against, source },
  ];
}

const wholes = ['takeoffDistance', 'accelerateGoDistance'] as const;
const runs = ['takeoffRun', 'engineOutTakeoffRun'] as const;

function stops(isTransportRule: boolean, source: ReferenceKey): readonly Requirement[] {
  const shared = { against: 'asda', source } as const;
  if (!isTransportRule) return [{ ...shared, code: 'accelerate-stop', of: 'accelerateStopDistance' }];
  return [
    { ...shared, code: 'accelerate-stop-all-engines', of: 'accelerateStopAllEngines' },
    { ...shared, code: 'accelerate-stop-engine-out', of: 'accelerateStopEngineOut' },
  ];
}

/** What a certified takeoff asks of TORA, TODA and ASDA; with a clearway the run ends in the middle between lift-off and screen. */
function checks(factor: Factor, hasClearway: boolean, source: ReferenceKey): readonly Requirement[] {
  return [
    ...both('takeoff-run', 'tora', hasClearway ? runs : wholes, factor, source),
    ...both('takeoff-distance', 'toda', wholes, factor, source),
    ...stops(factor === transport, source),
  ];
}

function hasClearway({ published: { tora, toda } }: Asked): boolean {
  return tora !== undefined && toda !== undefined && toda > tora;
}

/** The comparisons of a takeoff of the transport category alone. @see certifiedTakeoff */
export function transportTakeoff(source: ReferenceKey): readonly Reading[] {
  return [
    {
      when: 'transport category, a clearway is declared',
      holds: (asked) => isTransport(asked.aeroplane) && hasClearway(asked),
      requirements: checks(transport, true, source),
    },
    {
      when: 'transport category, no clearway is declared',
      holds: ({ aeroplane }) => isTransport(aeroplane),
      requirements: checks(transport, false, source),
    },
  ];
}

/** The comparisons of a takeoff of the commuter category, whatever the aeroplane is. @see certifiedTakeoff */
export function commuterTakeoff(source: ReferenceKey): readonly Reading[] {
  return [
    {
      when: 'outside the transport category, a clearway is declared',
      holds: hasClearway,
      requirements: checks(commuter, true, source),
    },
    {
      when: 'outside the transport category, no clearway is declared',
      holds: () => true,
      requirements: checks(commuter, false, source),
    },
  ];
}

/**
 * The comparisons of a takeoff whose certified distances hold an engine failure: run, distance and accelerate-stop distance, each
 * the greater of that with all engines (times 1.15 where it is to the screen) and that with a failure.
 *
 * What a wet runway asks for besides is composed where the distances are computed. An aeroplane outside the transport category is
 * asked as one of the commuter category.
 *
 * @param source - the operating rule that compares them with the declared distances
 * @see references.Cfr25s113; references.Cfr25s109a; references.Cfr23s59; references.Cfr23s55
 */
export function certifiedTakeoff(source: ReferenceKey): readonly Reading[] {
  return [...transportTakeoff(source), ...commuterTakeoff(source)];
}
