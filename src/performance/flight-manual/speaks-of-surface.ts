import { filmAsWet, type RunwaySurface } from '../../physics/runway-surface.ts';

/**
 * Whether a sheet or a note for one surface speaks of another.
 *
 * Kind and state are the same; damp counts as wet, a film of water too, and dry never speaks of wet. Without a length of grass it
 * speaks of short and long; grass of unstated length counts as long. Unstated ground is firm on both sides: what does not say soft
 * does not speak of soft. A contaminant is the same and no deeper.
 */
export function speaksOfSurface(stated: RunwaySurface, asked: RunwaySurface): boolean {
  const here = filmAsWet(stated);
  const there = filmAsWet(asked);
  return (
    here.kind === there.kind &&
    (here.state === there.state || (here.state === 'wet' && there.state === 'damp')) &&
    (here.grass === undefined || here.grass === (there.grass ?? 'long')) &&
    (here.firmness ?? 'firm') === (there.firmness ?? 'firm') &&
    coversContaminant(here.contaminant, there.contaminant)
  );
}

/** How closely a surface is described: a note that states more goes before one that states less. */
export function closeness({ grass, firmness, contaminant }: RunwaySurface): number {
  return Number(grass !== undefined) + Number(firmness !== undefined) + Number(contaminant?.depth !== undefined);
}

export function isPavedDry(surface: RunwaySurface): boolean {
  return speaksOfSurface({ kind: 'paved', state: 'dry' }, surface);
}

function coversContaminant(stated: RunwaySurface['contaminant'], asked: RunwaySurface['contaminant']): boolean {
  if (stated === undefined || asked === undefined) return stated === asked;
  if (stated.kind !== asked.kind) return false;
  return stated.depth === undefined || (asked.depth !== undefined && asked.depth <= stated.depth);
}
