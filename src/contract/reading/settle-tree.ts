import type { Fault } from '../../planning/fault.ts';
import { pointerTo } from './json-pointer.ts';

export interface SettledTree {
  readonly value: unknown;
  /** members of all objects in the tree */
  readonly members: number;
  /** pointer of the first member that reaches for a prototype */
  readonly reaching?: string;
  readonly slips: readonly Fault[];
}

/** Control characters of C0 and C1, DEL, and surrogates without their other half. */
const unprintable = /[\p{Cc}\p{Cs}]/u;

interface Walk {
  members: number;
  reaching: string | undefined;
  slips: Fault[];
  readonly odd: boolean;
}

/**
 * Counts the members of a fresh tree and settles it in place: -0 becomes 0, unprintable text is noted.
 *
 * Pointers are built only where something is found, by a second walk, since nearly every tree is clean.
 *
 * @param odd - whether any string may hold unprintable text; false spares the look at each
 */
export function settleTree(value: unknown, odd: boolean): SettledTree {
  const walk: Walk = { members: 0, reaching: undefined, slips: [], odd };
  if (typeof value === 'object' && value !== null) settle(value as Record<string, unknown>, walk);
  else if (odd && typeof value === 'string' && unprintable.test(value)) walk.slips.push(unprintableText(''));
  if (walk.reaching !== undefined || walk.slips.length > 0) {
    walk.slips = [];
    walk.reaching = undefined;
    locate(value, '', walk);
  }
  return {
    value: value === 0 ? 0 : value,
    members: walk.members,
    slips: walk.slips,
    ...(walk.reaching === undefined ? {} : { reaching: walk.reaching }),
  };
}

function settle(node: Record<string, unknown>, walk: Walk): void {
  const list = Array.isArray(node);
  for (const name in node) {
    const child = node[name];
    if (!list) {
      walk.members++;
      if (reaches(name, child)) walk.reaching = name;
      if (walk.odd && unprintable.test(name)) walk.slips.push(unprintableText(name));
    }
    if (typeof child === 'object') {
      if (child !== null) settle(child as Record<string, unknown>, walk);
    } else if (child === 0) node[name] = 0;
    else if (walk.odd && typeof child === 'string' && unprintable.test(child)) walk.slips.push(unprintableText(name));
  }
}

function reaches(name: string, child: unknown): boolean {
  return (
    name === '__proto__' ||
    (name === 'constructor' && typeof child === 'object' && child !== null && Object.hasOwn(child, 'prototype'))
  );
}

function locate(node: unknown, pointer: string, walk: Walk): void {
  if (typeof node === 'string' && unprintable.test(node)) walk.slips.push(unprintableText(pointer));
  if (typeof node !== 'object' || node === null) return;
  for (const [name, child] of Object.entries(node)) {
    const at = pointerTo(pointer, name);
    if (!Array.isArray(node)) {
      if (reaches(name, child)) walk.reaching ??= at;
      if (unprintable.test(name)) walk.slips.push(unprintableText(at));
    }
    locate(child, at, walk);
  }
}

function unprintableText(pointer: string): Fault {
  const shown = pointer.replace(new RegExp(unprintable, 'gu'), '\ufffd');
  return {
    pointer: shown,
    code: 'wrong-type',
    message: 'The text holds a control character or half of a surrogate pair.',
    allowed: 'text of printable characters',
  };
}
