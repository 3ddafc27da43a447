import { Fragment } from 'react';

/** The little of Markdown that the document's texts use: paragraphs, and `code`. */
export function Prose({ children }: { children: string }) {
  return children.split('\n\n').map((paragraph, index) => <p key={index} className="max-w-prose"><Line>{paragraph}</Line></p>);
}

/** A paragraph's text alone, for the cell of a table. */
export function Line({ children }: { children: string }) {
  return children.split('`').map((piece, i) => (i % 2 === 1 ? <code key={i} className="figure text-[0.9375rem] wrap-anywhere">{piece}</code> : <Fragment key={i}>{piece}</Fragment>));
}
