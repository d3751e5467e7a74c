import process from 'node:process';
import { CatalogueFault } from './catalogue/catalogue-fault.ts';
import { sealFolder } from './catalogue/seal-folder.ts';

/** Seals a folder of aeroplane files and the aerodromes within it: `npm run seal -- <folder>`. */
function seal([folder, ...others]: readonly string[]): number {
  if (folder === undefined || others.length > 0) {
    process.stderr.write('usage: npm run seal -- <folder of aeroplane files>\n');
    return 2;
  }
  try {
    const sealing = sealFolder(folder);
    if ('faults' in sealing) {
      for (const fault of sealing.faults) process.stderr.write(`${fault}\n`);
      return 1;
    }
    for (const { definition, digest } of sealing.sealed) process.stdout.write(`${definition.id} ${digest}\n`);
    process.stdout.write(`sealed: ${sealing.sealed.length} in ${folder}\n`);
    return 0;
  } catch (error) {
    if (!(error instanceof CatalogueFault)) throw error;
    process.stderr.write(`${error.message}\n`);
    return 1;
  }
}

process.exitCode = seal(process.argv.slice(2));
