/**
 * The Message-ID of a mail: from its own id, so that all attempts carry the same and a reader's server knows a second copy.
 *
 * @param id of the mail, unique by itself
 * @param from the sender, as "Carryover <carryover@example.org>"
 * @example messageIdOf('0192f0c1-…', 'Carryover <carryover@example.org>') // '<0192f0c1-…@example.org>'
 */
export function messageIdOf(id: string, from: string): string {
  const domain = /@([^\s<>@"]+)>?\s*$/.exec(from)?.[1] ?? 'carryover.invalid';
  return `<${id}@${domain}>`;
}
