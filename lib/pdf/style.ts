import { StyleSheet } from '@react-pdf/renderer';
import { FIGURES, TEXT } from './fonts';

/** In black on white: it is printed, copied and faxed. Sizes in points. */
const INK = '#111111';
const SOFT = '#444444';
const RULE = '#999999';

// The renderer takes a list of families, one for each sign in turn; its types know of one alone.
const families = (names: string[]) => names as unknown as string;

export const MARGIN_PT = 42;

export const style = StyleSheet.create({
  page: { fontFamily: families(TEXT), fontSize: 9.5, color: INK, paddingTop: MARGIN_PT, paddingHorizontal: MARGIN_PT, paddingBottom: 74 },
  // Not of the page: a number of pages, which is set at the end, would take no room.
  body: { fontSize: 9.5, lineHeight: 1.35 },
  top: { borderBottomWidth: 1.5, borderColor: INK, paddingBottom: 8, marginBottom: 10 },
  title: { fontSize: 19, fontWeight: 700, lineHeight: 1.2 },
  reference: { fontFamily: families(FIGURES), fontSize: 12, fontWeight: 700 },
  h2: { fontSize: 13, fontWeight: 700, lineHeight: 1.2, marginTop: 14, borderBottomWidth: 0.75, borderColor: INK, paddingBottom: 2, marginBottom: 5 },
  h3: { fontSize: 10.5, fontWeight: 700, marginTop: 7, marginBottom: 2 },
  text: { marginBottom: 3 },
  quiet: { fontSize: 8, lineHeight: 1.25, color: SOFT, marginTop: 3 },
  fact: { flexDirection: 'row', paddingVertical: 1.5 },
  term: { width: '36%', paddingRight: 8, color: SOFT },
  value: { width: '64%' },
  row: { flexDirection: 'row', borderBottomWidth: 0.5, borderColor: RULE, paddingVertical: 3 },
  columns: { flexDirection: 'row', borderBottomWidth: 1, borderColor: INK, paddingBottom: 2, marginTop: 2, fontSize: 8, lineHeight: 1.25, fontWeight: 700 },
  cell: { paddingRight: 6 },
  figure: { fontFamily: families(FIGURES), fontSize: 9 },
  strong: { fontWeight: 700 },
  note: { fontSize: 7.5, lineHeight: 1.25, color: SOFT },
  level: { flexDirection: 'row', alignItems: 'center', paddingVertical: 3 },
  percent: { width: 44, fontFamily: families(FIGURES), fontWeight: 700, fontSize: 11 },
  reason: { flexDirection: 'row', marginLeft: 64, fontSize: 8.5, lineHeight: 1.25, marginBottom: 1.5 },
  photos: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'space-between' },
  photo: { marginBottom: 10 },
  caution: { borderWidth: 1, borderColor: INK, padding: 6, marginTop: 14, fontSize: 9 },
  foot: { position: 'absolute', bottom: 26, left: MARGIN_PT, right: MARGIN_PT, borderTopWidth: 0.75, borderColor: INK, paddingTop: 4, fontSize: 7.5, color: SOFT },
  pageNumber: { position: 'absolute', bottom: 48, left: MARGIN_PT, right: MARGIN_PT, textAlign: 'right', fontSize: 7.5, color: SOFT },
  hash: { fontFamily: families(FIGURES), fontSize: 6.8 },
});

/** A heading goes on to the next page with what it is about: itself, the head of a table and a row of it. */
export const WITH_HEADING_PT = 90;
/** The same with a photo of the usual shape. */
export const WITH_PHOTOS_PT = 230;

export { INK };
