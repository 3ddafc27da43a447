import { useId, type ReactNode } from 'react';
import { classes } from './classes';

export type NoticeKind = 'info' | 'caution' | 'danger' | 'saved';

interface Props {
  kind?: NoticeKind;
  /** A heading of its own; cautions and dangers always have one. */
  title?: ReactNode;
  children: ReactNode;
  /** Steps or buttons under the text. */
  actions?: ReactNode;
  className?: string;
}

const words: Record<NoticeKind, string | undefined> = { info: undefined, caution: 'Caution', danger: 'Danger', saved: 'Saved' };

/**
 * Something that must be read. `caution` (hatched tape) warns of a hazard before steps; `danger` (red) is
 * danger to people now, such as a vehicle that must not be released; `saved` is announced politely.
 * The kind is always in words, never only in colour.
 * @example <Notice kind="caution" title="Air under pressure">Drain all tanks before a fitting is opened.</Notice>
 */
export function Notice({ kind = 'info', title, children, actions, className }: Props) {
  const headingId = useId();
  const grave = kind === 'caution' || kind === 'danger';
  const word = words[kind];
  return (
    <section
      role={kind === 'saved' ? 'status' : grave ? 'group' : undefined}
      aria-labelledby={word || title ? headingId : undefined}
      className={classes(
        'keep relative max-w-prose py-3 pr-4 pl-9',
        kind === 'danger' ? 'border-2 border-danger bg-danger-ground' : 'border-y border-ink bg-sheet',
        className,
      )}
    >
      <span aria-hidden="true" className={classes('absolute inset-y-0 left-0 w-4 border-r', edge[kind])} />
      {(word || title) && (
        <h3 id={headingId} className={classes('text-lg', kind === 'danger' && 'text-danger')}>
          {word && title ? (
            <>
              <span className="label mr-2 align-baseline">{word}</span> {title}
            </>
          ) : (
            (title ?? word)
          )}
        </h3>
      )}
      <div className="mt-0.5">{children}</div>
      {actions && <div className="mt-3 flex flex-wrap gap-3">{actions}</div>}
    </section>
  );
}

const edge: Record<NoticeKind, string> = {
  info: 'border-ink bg-sunk',
  caution: 'border-ink hatch text-ink',
  danger: 'border-danger hatch text-danger',
  saved: 'border-ink bg-ink',
};
