import { Fragment } from 'react';
import { Document, Page, Text, View, renderToBuffer } from '@react-pdf/renderer';
import type { DossierContent } from '@/lib/schemas/dossier-content';
import type { Paper } from '@/lib/schemas/dossier';
import { Block, Facts, type Pictures } from './blocks';
import { readyFonts } from './fonts';
import { printable } from './printable';
import { MARGIN_PT, style, WITH_HEADING_PT, WITH_PHOTOS_PT } from './style';

interface Asked {
  content: DossierContent;
  contentHash: string;
  paper: Paper;
  madeAt: Date;
  pictures: Pictures;
}

/** In points. */
const PAPERS = { a4: { size: 'A4', widthPt: 595.28 }, letter: { size: 'LETTER', widthPt: 612 } } as const satisfies Record<Paper, { size: string; widthPt: number }>;

let last: Promise<unknown> = Promise.resolve();

/**
 * A dossier as a PDF. The same content gives the same bytes: made again, it is the same file. One after another, because
 * the library has one set of fonts for all of a process.
 */
export function dossierPdf(asked: Asked): Promise<Buffer> {
  const made = last.then(() => setOnPaper(asked));
  last = made.catch(() => undefined);
  return made;
}

function setOnPaper({ content, contentHash, paper, madeAt, pictures }: Asked): Promise<Buffer> {
  readyFonts();
  const { size, widthPt } = PAPERS[paper];
  const { reference, organisation, title, head, sections, leftOut, caution } = content;
  return renderToBuffer(
    <Document title={printable(`${reference}: ${title}`)} author={printable(organisation)} subject={`SHA-256 ${contentHash}`} creator="Carryover" producer="Carryover" language="en" creationDate={madeAt} modificationDate={madeAt}>
      <Page size={size} style={style.page}>
        <View style={style.body}>
          <View style={style.top}>
            <Text style={style.reference}>{reference}</Text>
            <Text style={style.title}>{printable(title)}</Text>
            <Text>{printable(organisation)}</Text>
          </View>
          <Facts block={{ kind: 'facts', facts: [...head, ...(leftOut.length > 0 ? [{ term: 'Left out by its maker', value: leftOut.join('; ') }] : [])] }} />
          {/* Side by side and in no frame of their own: what stands first in a frame is never taken on to the next page. */}
          {sections.map((section) => (
            <Fragment key={section.id}>
              <Text style={style.h2} minPresenceAhead={section.blocks[0]?.kind === 'photos' ? WITH_PHOTOS_PT : WITH_HEADING_PT}>{printable(section.title)}</Text>
              {section.blocks.map((block, i) => (
                <Block key={i} block={block} pictures={pictures} widthPt={widthPt - 2 * MARGIN_PT} />
              ))}
            </Fragment>
          ))}
          <View style={style.caution} wrap={false}>
            <Text>{printable(caution)}</Text>
          </View>
        </View>
        <View style={style.foot} fixed>
          <Text>{printable(`${reference}, ${organisation}`)}</Text>
          <Text>The ranking is advice. The makers’ information and local rules come first.</Text>
          <Text style={style.hash}>SHA-256 of the content {contentHash}</Text>
        </View>
        <Text style={style.pageNumber} fixed render={({ pageNumber, totalPages }) => `page ${pageNumber} of ${totalPages}`} />
      </Page>
    </Document>,
  );
}
