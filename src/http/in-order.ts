import type { Catalogue } from '../catalogue/read-catalogue.ts';
import type { Config } from './config.ts';

/** What --check says where nothing is wrong, in one line. */
export function inOrder({ port, host }: Config, { aeroplanes, aerodromes, digest }: Catalogue): string {
  return `settings and catalogue are in order: ${aeroplanes.builtIn} built-in aeroplanes and ${aeroplanes.own} of the operator's own, ${aerodromes.count.builtIn} built-in aerodromes and ${aerodromes.count.own} own, SHA-256 ${digest}; would listen on ${host} port ${port}`;
}
