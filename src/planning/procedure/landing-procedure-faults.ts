import type { Configuration } from '../../performance/aeroplane.ts';
import { chosenConfiguration, isFault } from '../chosen.ts';
import type { Fault } from '../fault.ts';
import type { LandingQuestion } from '../question.ts';
import { steepestWithoutData } from '../rules/landing-defaults.ts';
import { noDataFault } from './no-data-fault.ts';

type Asked = Pick<LandingQuestion, 'aeroplane' | 'aeroplaneAt' | 'configuration' | 'procedure'>;

/**
 * What of the procedure the aeroplane has no data for, or what goes against the data it has; of a configuration that is not there
 * nothing is said.
 */
export function landingProcedureFaults(question: Asked): Fault[] {
  const { aeroplane, configuration: id, procedure = {} } = question;
  const { approachSpeedIncrement, reverse, antiSkid } = procedure;
  const faults: Fault[] = [];
  const configuration = chosenConfiguration(question, 'landing');
  if (reverse && aeroplane.reverseThrust === undefined) {
    faults.push(noDataFault(question, 'reverse', reverse, '/reverseThrust'));
  }
  if (antiSkid !== undefined && aeroplane.brakes?.antiSkid === undefined) {
    faults.push(noDataFault(question, 'antiSkid', antiSkid, '/brakes/antiSkid'));
  }
  if (antiSkid === 'operative' && aeroplane.brakes?.antiSkid === 'none') {
    faults.push({
      pointer: '/procedure/antiSkid',
      code: 'contradiction',
      message: `${aeroplane.id} has no anti-skid system.`,
      received: antiSkid,
      allowed: 'inoperative, or nothing',
    });
  }
  if (isFault(configuration)) return faults;
  if (approachSpeedIncrement !== undefined && configuration.speeds?.landingReference === undefined) {
    const needed = `/configurations/${id}/speeds/landingReference`;
    faults.push(noDataFault(question, 'approachSpeedIncrement', undefined, needed));
  }
  return [...faults, ...angleFaults(question, configuration), ...reactionFaults(question, configuration)];
}

/** An approach angle goes up to the definition's own, and to 4 degrees where that is less. */
function angleFaults(question: Asked, configuration: Configuration): Fault[] {
  const asked = question.procedure?.approachAngle;
  if (asked === undefined) return [];
  const own = configuration.approachAngle;
  if (own === undefined) {
    const needed = `/configurations/${question.configuration}/approachAngle`;
    return [noDataFault(question, 'approachAngle', degrees(asked), needed)];
  }
  const steepest = Math.max(own, steepestWithoutData);
  if (asked <= steepest + 1e-9) return [];
  return [
    {
      pointer: '/procedure/approachAngle',
      code: 'contradiction',
      message: `The definition of ${question.aeroplane.id} has an approach angle of ${degrees(own)}°; ${degrees(asked)}° is steeper than 4° and has no data.`,
      received: degrees(asked),
      allowed: `up to ${degrees(steepest)}°`,
    },
  ];
}

/** A reaction time is not shorter than the definition's own time from touchdown to braking. */
function reactionFaults(question: Asked, configuration: Configuration): Fault[] {
  const asked = question.procedure?.reactionTime;
  if (asked === undefined) return [];
  const own = configuration.freeRollTime;
  if (own === undefined) {
    const needed = `/configurations/${question.configuration}/freeRollTime`;
    return [noDataFault(question, 'reactionTime', asked, needed)];
  }
  if (asked >= own - 1e-9) return [];
  return [
    {
      pointer: '/procedure/reactionTime',
      code: 'contradiction',
      message: `The definition of ${question.aeroplane.id} has ${own} s from touchdown to braking; ${asked} s is shorter.`,
      received: asked,
      allowed: `${own} s or more`,
    },
  ];
}

function degrees(angle: number): number {
  return Math.round((angle * 1800) / Math.PI) / 10;
}
