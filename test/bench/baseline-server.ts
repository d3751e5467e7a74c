/**
 * The yardstick of the HTTP benchmark: a plain Fastify route without a log that parses the same body with JSON.parse and
 * stringifies an object of the size of our answer. Prints its port.
 */
import { readFileSync } from 'node:fs';
import fastify from 'fastify';

const answer = JSON.parse(readFileSync(process.argv[2] as string, 'utf8')) as object;
const app = fastify({ logger: false });
app.post('/', (_request, reply) => {
  reply.type('application/json; charset=utf-8').send(JSON.stringify(answer));
});
await app.listen({ port: 0, host: '127.0.0.1' });
const address = app.server.address();
if (typeof address === 'object' && address !== null) process.stdout.write(`${address.port}\n`);
