/** Something about the input that its writer can mend: shown as one line, without a stack. */
export class InputError extends Error {
  override readonly name = 'InputError';
}
