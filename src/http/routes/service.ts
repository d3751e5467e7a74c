import type { FastifyInstance } from 'fastify';
import type { Catalogue } from '../../catalogue/read-catalogue.ts';
import { liveness, readiness, version } from '../../contract/service-state.ts';
import { modelVersion } from '../../planning/model-version.ts';
import { addResource } from '../resource.ts';
import { serviceName, serviceVersion } from '../service-version.ts';

/** State and version. The house listens only after it has answered its own questions, so that reachable is ready. */
export function service(app: FastifyInstance, catalogue: Catalogue): void {
  addResource(app, {
    url: '/health/live',
    operationId: 'live',
    summary: 'Is the process alive?',
    description: 'Answers as long as the process runs.',
    tag: 'service',
    response: liveness,
    answer: { status: 'live' },
  });
  addResource(app, {
    url: '/health/ready',
    operationId: 'ready',
    summary: 'Can the service compute?',
    description: 'Answers 200 once questions of each kind have been computed, and 503 while the service closes.',
    tag: 'service',
    response: readiness,
    answer: { status: 'ready' },
  });
  addResource(app, {
    url: '/version',
    operationId: 'version',
    summary: 'What is running?',
    description: 'Versions of service and model, and the digest of the catalogue.',
    tag: 'service',
    response: version,
    answer: {
      service: serviceName,
      version: serviceVersion,
      modelVersion,
      aeroplanes: catalogue.aeroplanes,
      aerodromes: catalogue.aerodromes.count,
      digests: { catalogue: catalogue.digest },
    },
  });
}
