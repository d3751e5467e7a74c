import closeWithGrace from 'close-with-grace';
import { readCatalogue } from './catalogue/read-catalogue.ts';
import { readCommandLine } from './http/command-line.ts';
import { readConfig } from './http/config.ts';
import { inOrder } from './http/in-order.ts';
import { logOptions } from './http/log-options.ts';

try {
  const { check } = readCommandLine(process.argv.slice(2));
  const config = readConfig(process.env);
  const catalogue = readCatalogue(config.catalogue);
  if (check) process.stdout.write(`${inOrder(config, catalogue)}\n`);
  else {
    // loaded last, so that a wrong setting or a changed file is told at once
    const { buildApp } = await import('./http/app.ts');
    const { port, host, logLevel } = config;
    const app = await buildApp({ catalogue, logger: logOptions(logLevel) });
    closeWithGrace({ delay: 10_000, logger: app.log }, async ({ err }) => {
      if (err) app.log.fatal({ err }, 'closing after an error that nothing caught');
      await app.close();
    });
    await app.listen({ port, host });
  }
} catch (error) {
  const reason = error instanceof Error ? error.message : String(error);
  process.stderr.write(`field-length service does not start: ${reason.replace(/\s+/g, ' ')}\n`);
  process.exit(1);
}
