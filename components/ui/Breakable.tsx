import { Fragment } from 'react';

/**
 * A path or a dotted name, which may break after its marks, or an address, which may break after its @; and while that
 * is enough, nowhere else.
 * @example <Breakable>{email}</Breakable>
 */
export function Breakable({ children }: { children: string }) {
  return children.split(children.includes('@') ? /(?<=@)/ : /(?<=[/._-])/).map((piece, index) => <Fragment key={index}>{index > 0 && <wbr />}{piece}</Fragment>);
}
