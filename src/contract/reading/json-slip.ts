import { pointerTo } from './json-pointer.ts';

/** Where a text first leaves strict JSON. */
export interface JsonSlip {
  readonly kind: 'not-json' | 'duplicate';
  /** RFC 6901 pointer of the place, as far as it was read */
  readonly pointer: string;
  /** characters from the start, the first being 1 */
  readonly position: number;
}

const space = /[ \t\n\r]*/y;
const scalar = /-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?(?![\w.+-])|(?:true|false|null)(?!\w)/y;
const string = /"(?:[ !#-[\]-\uffff]|\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4}))*"/y;

/**
 * Finds the first place where a text breaks the grammar of RFC 8259 or names a member twice in one object.
 *
 * Slow and exact; called only once a text is known to be wrong, to say where. Depth must have been bounded before.
 *
 * @returns the slip, or undefined where the text is strict JSON
 */
export function jsonSlip(text: string): JsonSlip | undefined {
  let at = 0;

  const slip = (kind: JsonSlip['kind'], pointer: string, index = at): JsonSlip => ({
    kind,
    pointer,
    position: index + 1,
  });

  function take(pattern: RegExp): string | undefined {
    pattern.lastIndex = at;
    const found = pattern.exec(text)?.[0];
    if (found !== undefined) at += found.length;
    return found;
  }

  function takes(character: string): boolean {
    take(space);
    if (text[at] !== character) return false;
    at++;
    return true;
  }

  function value(pointer: string): JsonSlip | undefined {
    if (takes('{')) return object(pointer);
    if (takes('[')) return array(pointer);
    return (take(string) ?? take(scalar)) === undefined ? slip('not-json', pointer) : undefined;
  }

  function object(pointer: string): JsonSlip | undefined {
    const names = new Set<string>();
    if (takes('}')) return undefined;
    do {
      take(space);
      const start = at;
      const literal = take(string);
      if (literal === undefined) return slip('not-json', pointer);
      const name = JSON.parse(literal) as string;
      const member = pointerTo(pointer, name);
      if (names.has(name)) return slip('duplicate', member, start);
      names.add(name);
      if (!takes(':')) return slip('not-json', member);
      const inner = value(member);
      if (inner !== undefined) return inner;
    } while (takes(','));
    return takes('}') ? undefined : slip('not-json', pointer);
  }

  function array(pointer: string): JsonSlip | undefined {
    if (takes(']')) return undefined;
    let index = 0;
    do {
      const inner = value(pointerTo(pointer, index++));
      if (inner !== undefined) return inner;
    } while (takes(','));
    return takes(']') ? undefined : slip('not-json', pointer);
  }

  const found = value('');
  take(space);
  return found ?? (at < text.length ? slip('not-json', '') : undefined);
}
