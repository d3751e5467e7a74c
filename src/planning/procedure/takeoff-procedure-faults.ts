import { chosenConfiguration, isFault } from '../chosen.ts';
import type { Fault } from '../fault.ts';
import type { TakeoffQuestion } from '../question.ts';
import { noDataFault } from './no-data-fault.ts';

type Asked = Pick<TakeoffQuestion, 'aeroplane' | 'aeroplaneAt' | 'configuration' | 'procedure'>;

/** What of the procedure the aeroplane has no data for; of a configuration that is not there nothing is said. */
export function takeoffProcedureFaults(question: Asked): Fault[] {
  const { aeroplane, configuration: id, procedure = {} } = question;
  const { power, start } = procedure;
  const faults: Fault[] = [];
  const settings = aeroplane.propulsion.powerSettings;
  if (power !== undefined && settings === undefined) {
    faults.push(noDataFault(question, 'power', power, '/propulsion/powerSettings'));
  }
  if (power !== undefined && settings !== undefined && !Object.hasOwn(settings, power)) {
    faults.push({
      pointer: '/procedure/power',
      code: 'unknown-id',
      message: `${aeroplane.id} has no power setting '${power}'.`,
      received: power,
      allowed: Object.keys(settings).join(', '),
      hint: 'Leave power away for full power.',
    });
  }
  const configuration = chosenConfiguration(question, 'takeoff');
  if (isFault(configuration)) return faults;
  if (start === 'rolling' && configuration.rollingStartAllowance === undefined) {
    faults.push(noDataFault(question, 'start', start, `/configurations/${id}/rollingStartAllowance`));
  }
  return faults;
}
