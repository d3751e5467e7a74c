/** Writes the answers of openapi/examples anew: `npm run examples`. Read the difference before committing it. */
import { writeFileSync } from 'node:fs';
import { readCatalogue } from '../../src/catalogue/read-catalogue.ts';
import { buildApp } from '../../src/http/app.ts';
import { exampleFile, readExamples } from './examples.ts';

const app = await buildApp({ catalogue: readCatalogue({ builtIn: true }) });
for (const { name, title, method, path, body } of readExamples()) {
  const response = await app.inject({ method, url: path, ...(body === undefined ? {} : { payload: body as object }) });
  const answer: unknown = response.json();
  const file = { title, method, path, ...(body === undefined ? {} : { body }), status: response.statusCode, answer };
  writeFileSync(exampleFile(name), `${JSON.stringify(file, null, 2)}\n`);
}
await app.close();
