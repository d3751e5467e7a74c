import { mkdirSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { readCatalogue } from '../catalogue/read-catalogue.ts';
import { buildApp } from './app.ts';

const path = process.argv[2] ?? 'openapi/openapi.json';
const app = await buildApp({ catalogue: readCatalogue({ builtIn: true }), settings: { warmUpRounds: 0 } });
await app.ready();
mkdirSync(dirname(path), { recursive: true });
writeFileSync(path, `${JSON.stringify(app.swagger(), undefined, 2)}\n`);
await app.close();
