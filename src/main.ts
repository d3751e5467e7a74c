import closeWithGrace from 'close-with-grace';
import { readCatalogue } from './catalogue/read-catalogue.ts';
import { buildApp } from './http/app.ts';
import { readConfig } from './http/config.ts';
import { logOptions } from './http/log-options.ts';

try {
  const { port, host, logLevel } = readConfig(process.env);
  const catalogue = readCatalogue({ builtIn: true });
  const app = await buildApp({ catalogue, logger: logOptions(logLevel) });
  closeWithGrace({ delay: 10_000, logger: app.log }, async ({ err }) => {
    if (err) app.log.fatal({ err }, 'closing after an error that nothing caught');
    await app.close();
  });
  await app.listen({ port, host });
} catch (error) {
  const reason = error instanceof Error ? error.message : String(error);
  process.stderr.write(`field-length service does not start: ${reason.replace(/\s+/g, ' ')}\n`);
  process.exit(1);
}
