import { serviceVersion } from '../service-version.ts';

/** The part of the document that belongs to no route. */
export const documentHead = {
  openapi: '3.1.0',
  info: {
    title: 'field-length service',
    version: serviceVersion,
    description:
      'Takeoff and landing distances of small fixed-wing aeroplanes, computed and compared with the runway. Advisory only: computed figures are no page of the flight manual.',
    license: { name: 'Unlicensed' },
  },
  servers: [{ url: '/', description: 'This service.' }],
  tags: [
    { name: 'questions', description: 'A question in, an answer out; nothing is kept.' },
    { name: 'lists', description: 'What the questions may name.' },
    { name: 'service', description: 'State and version of the service.' },
  ],
};
