import { Image, Polyline, Rect, Svg, Text, View } from '@react-pdf/renderer';
import type { DossierBlock, DossierPhoto } from '@/lib/schemas/dossier-content';
import { printable } from './printable';
import { INK, style, WITH_HEADING_PT } from './style';

/** The reduced picture of a photo, as a JPEG. */
export type Pictures = (photoId: string) => Buffer | undefined;

type Of<Kind extends DossierBlock['kind']> = Extract<DossierBlock, { kind: Kind }>;

/** One block of a section on paper. @param widthPt of the text */
export function Block({ block, pictures, widthPt }: { block: DossierBlock; pictures: Pictures; widthPt: number }) {
  switch (block.kind) {
    case 'text':
      return <Text style={block.quiet ? style.quiet : style.text}>{printable(block.text)}</Text>;
    case 'heading':
      return <Text style={style.h3} minPresenceAhead={WITH_HEADING_PT}>{printable(block.text)}</Text>;
    case 'facts':
      return <Facts block={block} />;
    case 'table':
      return <Table block={block} />;
    case 'levels':
      return <Levels block={block} />;
    case 'photos':
      return <Photos block={block} pictures={pictures} widthPt={widthPt} />;
  }
}

export const Facts = ({ block }: { block: Of<'facts'> }) => (
  <View>
    {block.facts.map(({ term, value }, i) => (
      <View key={i} style={style.fact} wrap={false}>
        <Text style={style.term}>{printable(term)}</Text>
        <Text style={style.value}>{printable(value)}</Text>
      </View>
    ))}
  </View>
);

/** Its heads stand again on each page that it goes on to. */
function Table({ block: { columns, rows } }: { block: Of<'table'> }) {
  const all = columns.reduce((sum, { share }) => sum + share, 0);
  const width = (share: number) => ({ width: `${(100 * share) / all}%` });
  return (
    <View>
      <View style={style.columns} fixed>
        {columns.map(({ title, share }, i) => (
          <Text key={i} style={[style.cell, width(share)]}>{printable(title)}</Text>
        ))}
      </View>
      {rows.map(({ cells, note, strong }, i) => (
        <View key={i} style={strong ? [style.row, style.strong] : style.row} wrap={false}>
          {columns.map(({ share, figure }, at) => (
            <View key={at} style={[style.cell, width(share)]}>
              <Text style={figure ? style.figure : {}}>{printable(cells[at] ?? '')}</Text>
              {at === 0 && note !== null && <Text style={[style.note, { fontWeight: 400 }]}>{printable(note)}</Text>}
            </View>
          ))}
        </View>
      ))}
    </View>
  );
}

const [GLASS_W, GLASS_H] = [9, 20];

/** A level as a small sight glass, with its figure beside it. */
const Levels = ({ block }: { block: Of<'levels'> }) => (
  <View>
    {block.levels.map(({ name, p, printed, reasons }, i) => (
      <View key={i}>
        <View style={style.level} wrap={false} minPresenceAhead={reasons.length > 0 ? 30 : 0}>
          <Svg width={GLASS_W + 9} height={GLASS_H}>
            <Rect x={0.5} y={0.5} width={GLASS_W} height={GLASS_H - 1} rx={2} stroke={INK} strokeWidth={0.8} fill="#ffffff" />
            <Rect x={0.5} y={0.5 + (GLASS_H - 1) * (1 - p)} width={GLASS_W} height={(GLASS_H - 1) * p} fill={INK} />
          </Svg>
          <Text style={style.percent}>{printed}</Text>
          <Text style={i === 0 ? style.strong : {}}>{printable(name)}</Text>
        </View>
        {reasons.map((reason, at) => (
          <View key={at} style={style.reason} wrap={false}>
            <Text>– {printable(reason)}</Text>
          </View>
        ))}
      </View>
    ))}
  </View>
);

const TALLEST_PT = 260;

function Photos({ block, pictures, widthPt }: { block: Of<'photos'>; pictures: Pictures; widthPt: number }) {
  const columnPt = widthPt * 0.48;
  return (
    <View style={style.photos}>
      {block.photos.map((photo) => (
        <Photo key={photo.id} photo={photo} data={pictures(photo.id)} columnPt={columnPt} />
      ))}
    </View>
  );
}

function Photo({ photo, data, columnPt }: { photo: DossierPhoto; data: Buffer | undefined; columnPt: number }) {
  const scale = Math.min(columnPt / photo.width, TALLEST_PT / photo.height);
  const [width, height] = [photo.width * scale, photo.height * scale];
  return (
    <View style={[style.photo, { width: columnPt }]} wrap={false}>
      {data && (
        <View style={{ width, height }}>
          {/* eslint-disable-next-line jsx-a11y/alt-text -- on paper a picture has its caption; nothing of the library keeps it after it is set */}
          <Image src={{ data, format: 'jpg' }} cache={false} style={{ width, height }} />
          <Svg viewBox={`0 0 ${width} ${height}`} style={{ position: 'absolute', left: 0, top: 0, width, height }}>
            {photo.strokes.flatMap(({ points }, i) => {
              const line = points.map(([x, y]) => `${x * width},${y * height}`).join(' ');
              return [<Polyline key={`${i} under`} points={line} stroke="#ffffff" strokeWidth={3.5} fill="none" />, <Polyline key={i} points={line} stroke={INK} strokeWidth={1.6} fill="none" />];
            })}
          </Svg>
        </View>
      )}
      {photo.caption !== '' && <Text style={{ marginTop: 2 }}>{printable(photo.caption)}</Text>}
      <Text style={style.note}>{printable(photo.about)}</Text>
    </View>
  );
}
