import type { Factor } from '../../answer.ts';

/** LDA is at least 115 % of the landing distance at the time of arrival. @see references.EuAirOps303 */
export const timeOfArrival: Factor = {
  code: 'overall',
  value: 1.15,
  because: '115 % of the landing distance at the time of arrival',
  source: 'EuAirOps303',
  status: 'read',
};
