import { Marks } from '@/components/photos/Marks';
import { classes } from '@/components/ui/classes';
import { SightGlass } from '@/components/ui/SightGlass';
import type { DossierBlock, DossierContent, DossierPhoto } from '@/lib/schemas/dossier-content';

type Of<Kind extends DossierBlock['kind']> = Extract<DossierBlock, { kind: Kind }>;

/** What a dossier says, as its PDF says it. */
export function DossierSections({ content: { sections } }: { content: DossierContent }) {
  return sections.map(({ id, title, blocks }) => (
    <section key={id} aria-labelledby={`section-${id}`} className="grid gap-3">
      <h2 id={`section-${id}`} className="border-b border-ink pb-1">{title}</h2>
      {blocks.map((block, i) => (
        <Block key={i} block={block} about={`${title}, part ${i + 1}`} />
      ))}
    </section>
  ));
}

function Block({ block, about }: { block: DossierBlock; about: string }) {
  switch (block.kind) {
    case 'text':
      return <p className={block.quiet ? 'max-w-prose text-[0.9375rem] text-ink-soft' : 'max-w-prose'}>{block.text}</p>;
    case 'heading':
      return <h3 className="mt-2 text-lg">{block.text}</h3>;
    case 'facts':
      return <Facts facts={block.facts} />;
    case 'table':
      return <Table block={block} about={about} />;
    case 'levels':
      return <Levels block={block} />;
    case 'photos':
      return (
        <ul className="grid gap-6 sm:grid-cols-2">
          {block.photos.map((photo) => (
            <Photo key={photo.id} photo={photo} />
          ))}
        </ul>
      );
  }
}

export const Facts = ({ facts }: { facts: readonly { term: string; value: string }[] }) => (
  <dl className="border-t border-rule">
    {facts.map(({ term, value }, i) => (
      <div key={i} className="grid grid-cols-[minmax(8rem,2fr)_3fr] items-baseline gap-4 border-b border-rule py-1.5">
        <dt className="text-ink-soft">{term}</dt>
        <dd className="wrap-anywhere">{value}</dd>
      </div>
    ))}
  </dl>
);

/** Wider than a phone, it is moved by itself and not the page. */
const Table = ({ block: { columns, rows }, about }: { block: Of<'table'>; about: string }) => (
  <div className="overflow-x-auto" role="region" aria-label={about} tabIndex={0}>
    <table className="w-full min-w-[36rem] text-left print:min-w-0">
      <thead>
        <tr>
          {columns.map(({ title }) => (
            <th key={title} scope="col" className="label border-b border-ink py-1 pr-4 align-bottom">{title}</th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map(({ cells, note, strong }, i) => (
          <tr key={i} className={strong ? 'font-bold' : undefined}>
            {columns.map(({ title, figure, share }, at) => (
              <td key={title} className={classes('border-b border-rule py-2 pr-4 align-top', figure && 'figure')} style={{ width: `${share}%` }}>
                {cells[at]}
                {at === 0 && note !== null && <span className="block text-[0.9375rem] font-normal text-ink-soft">{note}</span>}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  </div>
);

const Levels = ({ block: { levels } }: { block: Of<'levels'> }) => (
  <ol className="grid gap-3">
    {levels.map(({ name, p, printed, reasons }) => (
      <li key={name} className="keep grid gap-1">
        <p className="flex items-center gap-4">
          <SightGlass value={p} printed={printed} size="small" />
          <span className="sr-only">{printed}</span>
          <strong>{name}</strong>
        </p>
        {reasons.length > 0 && <ul className="ml-12 grid max-w-prose list-disc gap-1 text-[0.9375rem]">{reasons.map((reason) => <li key={reason}>{reason}</li>)}</ul>}
      </li>
    ))}
  </ol>
);

const Photo = ({ photo: { id, caption, about, width, height, strokes } }: { photo: DossierPhoto }) => (
  <li className="keep grid content-start gap-1">
    <span className="relative block border border-rule bg-sunk" style={{ aspectRatio: `${width} / ${height}` }}>
      {/* eslint-disable-next-line @next/next/no-img-element -- streamed through our own route */}
      <img src={`/api/v1/photos/${id}/picture`} alt={caption || `Photo, ${about}`} loading="lazy" className="absolute inset-0 size-full" />
      <Marks strokes={strokes} thin />
    </span>
    {caption && <span>{caption}</span>}
    <span className="text-[0.9375rem] text-ink-soft">{about}</span>
  </li>
);
