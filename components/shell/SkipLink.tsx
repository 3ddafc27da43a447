/** First stop of the keyboard: past the head of the page, to `#main`. */
export function SkipLink() {
  return (
    <a href="#main" className="sr-only rounded bg-ink px-5 py-3 font-bold text-paper focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-20">
      Skip to the content
    </a>
  );
}
