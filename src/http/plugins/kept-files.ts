import { readdirSync, readFileSync } from 'node:fs';
import { extname, join } from 'node:path';
import type { FastifyInstance } from 'fastify';
import { problemOf } from '../../contract/problem.ts';
import { sendProblem } from '../problems.ts';

const mediaTypes: Readonly<Record<string, string>> = {
  '.css': 'text/css; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.png': 'image/png',
  '.svg': 'image/svg+xml',
};

/**
 * Answers a folder's style sheets, scripts and pictures from memory, whoever else registers a wildcard for them: read once at
 * start, so that no request reaches the disk and no name, range or condition in one can upset what serves files.
 *
 * @param pages - the instance whose wildcard routes are answered here; its other routes stay as they are
 * @param prefix - path under which the files stand, without a slash at its end
 */
export function keptFiles(pages: FastifyInstance, prefix: string, folder: string): void {
  const files = new Map<string, { readonly type: string; readonly bytes: Buffer }>();
  for (const name of readdirSync(folder)) {
    const type = mediaTypes[extname(name)];
    if (type !== undefined) files.set(`${prefix}/${name}`, { type, bytes: readFileSync(join(folder, name)) });
  }
  pages.addHook('onRequest', (request, reply, done) => {
    if (request.routeOptions.url?.endsWith('*') !== true) {
      done();
      return;
    }
    const file = files.get(request.url.split('?')[0] as string);
    if (file === undefined) sendProblem(reply, problemOf('not-found', 'There is nothing at this path.'));
    else {
      reply.headers({ 'cache-control': 'no-cache', 'content-length': file.bytes.length }).type(file.type);
      reply.send(request.method === 'HEAD' ? undefined : file.bytes);
    }
  });
}
