import qrcode from 'qrcode-generator';

/** Around the code, in modules: readers need it (ISO/IEC 18004). */
const QUIET = 4;

/** A text as a QR code, drawn black on white in any theme: a reader sees no other. */
export function QrCode({ text, label, className }: { text: string; label: string; className?: string }) {
  const code = qrcode(0, 'M');
  code.addData(text);
  code.make();
  const size = code.getModuleCount();
  const places = Array.from({ length: size }, (_, i) => i);
  const path = places.flatMap((row) => places.filter((column) => code.isDark(row, column)).map((column) => `M${column + QUIET} ${row + QUIET}h1v1h-1z`)).join('');
  const edge = size + 2 * QUIET;
  return (
    <svg role="img" aria-label={label} viewBox={`0 0 ${edge} ${edge}`} shapeRendering="crispEdges" className={className}>
      <rect width={edge} height={edge} fill="#fff" />
      <path d={path} fill="#000" />
    </svg>
  );
}
