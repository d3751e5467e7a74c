/**
 * Where a member of the aeroplane's definition stands in the request.
 *
 * An inline definition has a pointer like any other member: '/aeroplane/definition/propulsion/thrustFactor', and so have changes to
 * one on file: '/aeroplane/changes/propulsion/thrustFactor'. An aeroplane named by
 * id has no such member in the request, so the pointer into its definition follows the request's own after a '#':
 * '/aeroplane#/propulsion/thrustFactor'.
 *
 * @param aeroplaneAt - pointer to the aeroplane in the request, of the question
 * @param member - RFC 6901 pointer into the definition, beginning with '/'
 * @see references.Rfc6901
 */
export function aeroplanePointer(aeroplaneAt: string, member: string): string {
  return /\/(definition|changes)$/.test(aeroplaneAt) ? `${aeroplaneAt}${member}` : `${aeroplaneAt}#${member}`;
}

/** Where a member of the asked configuration stands in the request. */
export function configurationPointer(
  { aeroplaneAt, configuration }: { readonly aeroplaneAt: string; readonly configuration: string },
  member: string,
): string {
  const id = configuration.replaceAll('~', '~0').replaceAll('/', '~1');
  return aeroplanePointer(aeroplaneAt, `/configurations/${id}/${member}`);
}
