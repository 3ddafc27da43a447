/** Shown while a page is fetched. Words, no spinner: they appear only when it takes a moment. */
export default function Loading() {
  return (
    <p role="status" className="appear-late py-10 text-ink-soft">
      Fetching…
    </p>
  );
}
