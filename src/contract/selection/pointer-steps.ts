/**
 * The member names of a JSON pointer, in order; none for the whole.
 *
 * @returns undefined where the text is no pointer: it does not begin with '/', or a '~' is not part of '~0' or '~1'
 * @see references.Rfc6901, sec. 3 and 4
 */
export function pointerSteps(pointer: string): string[] | undefined {
  if (pointer === '') return [];
  if (!pointer.startsWith('/') || /~(?![01])/.test(pointer)) return undefined;
  return pointer
    .slice(1)
    .split('/')
    .map((step) => (step.includes('~') ? step.replaceAll('~1', '/').replaceAll('~0', '~') : step));
}
