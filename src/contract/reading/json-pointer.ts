/** One more step of an RFC 6901 pointer: '~' and '/' inside a name are written '~0' and '~1'. */
export function pointerTo(parent: string, member: string | number): string {
  return typeof member === 'number'
    ? `${parent}/${member}`
    : `${parent}/${member.replaceAll('~', '~0').replaceAll('/', '~1')}`;
}
