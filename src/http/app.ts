import fastify, { type FastifyInstance, type FastifyServerOptions, LogController } from 'fastify';
import type { Catalogue } from '../catalogue/read-catalogue.ts';
import { catalogueLookup } from './catalogue-lookup.ts';
import { acceptable } from './plugins/acceptable.ts';
import { clientError } from './plugins/client-error.ts';
import { closing } from './plugins/closing.ts';
import { documentation, documentPages } from './plugins/documentation.ts';
import { framing } from './plugins/framing.ts';
import { jsonBody } from './plugins/json-body.ts';
import { knownPaths } from './plugins/known-paths.ts';
import { answerError, lastResort } from './plugins/last-resort.ts';
import { parameters } from './plugins/parameters.ts';
import { requestId, requestIdOf } from './plugins/request-id.ts';
import { requestLog } from './plugins/request-log.ts';
import { aerodromes } from './routes/aerodromes.ts';
import { aeroplaneFit } from './routes/aeroplane-fit.ts';
import { aeroplanes } from './routes/aeroplanes.ts';
import { air } from './routes/air.ts';
import { airspeed } from './routes/airspeed.ts';
import { landingChoices, takeoffChoices } from './routes/choices.ts';

import { decode } from './routes/decode.ts';
import { landing } from './routes/landing.ts';
import { proof } from './routes/proof.ts';
import { proofread } from './routes/proofread.ts';
import { ruleSets } from './routes/rule-sets.ts';
import { service } from './routes/service.ts';
import { sources } from './routes/sources.ts';
import { speeds } from './routes/speeds.ts';
import { surfaces } from './routes/surfaces.ts';
import { tables } from './routes/tables.ts';
import { takeoff } from './routes/takeoff.ts';
import { defaultSettings, type Settings } from './settings.ts';
import { stamp } from './stamp.ts';

export interface House {
  readonly catalogue: Catalogue;
  readonly logger?: FastifyServerOptions['logger'];
  readonly settings?: Partial<Settings>;
}

/** Builds the service without listening. It is ready once each operation has answered its own questions. */
export async function buildApp({ catalogue, logger = false, settings }: House): Promise<FastifyInstance> {
  const { bodyLimit, warmUpRounds } = { ...defaultSettings, ...settings };
  const app: FastifyInstance = fastify({
    logger,
    logController: new LogController({ disableRequestLogging: true }),
    bodyLimit,
    genReqId: requestIdOf,
    requestIdHeader: false,
    trustProxy: false,
    return503OnClosing: false,
    maxRequestsPerSocket: 10_000,
    frameworkErrors: answerError,
    clientErrorHandler: clientError,
    routerOptions: { maxParamLength: 64 },
    http: { maxHeaderSize: 8192, headersTimeout: 4000, connectionsCheckingInterval: 500, requireHostHeader: false },
  });
  // the handlers check and write for themselves: the framework's own compilers would do it a second time
  app.setValidatorCompiler(() => () => true);
  app.setSerializerCompiler(() => JSON.stringify);

  for (const plugin of [
    lastResort,
    requestLog,
    requestId,
    closing,
    framing,
    knownPaths,
    parameters,
    acceptable,
    jsonBody,
  ]) {
    plugin(app);
  }
  await documentation(app);
  service(app, catalogue);
  aeroplanes(app, catalogue);
  aerodromes(app, catalogue);
  ruleSets(app);
  surfaces(app);
  sources(app);
  const lookup = catalogueLookup(catalogue);
  const ours = stamp();
  const warmUps = [
    takeoff(app, lookup, ours),
    landing(app, lookup, ours),
    takeoffChoices(app, lookup, ours),
    landingChoices(app, lookup, ours),
    speeds(app, lookup, ours),
    aeroplaneFit(app, lookup, ours),
    airspeed(app, lookup, ours),
    tables(app, lookup),
    air(app, ours),
    decode(app, ours),
    proofread(app, lookup, ours),
    proof(app, lookup, ours),
  ];
  await documentPages(app);

  app.addHook('onReady', (done) => {
    for (let round = 0; round < warmUpRounds; round++) for (const warmUp of warmUps) warmUp();
    done();
  });
  return app;
}
