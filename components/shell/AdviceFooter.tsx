/** What the product always says. */
export function AdviceFooter() {
  return (
    <footer className="mx-auto mt-16 w-full max-w-page px-4 pb-8 sm:px-6">
      <p className="border-t border-ink pt-3 text-[0.9375rem] text-ink-soft">
        The ranking is advice. The vehicle maker’s service information, local rules and a qualified person’s judgement come first.
      </p>
    </footer>
  );
}
