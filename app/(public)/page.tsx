import { OilPathDrawing } from '@/components/oil-path/OilPathDrawing';
import { ButtonLink } from '@/components/ui/Button';
import { classes } from '@/components/ui/classes';

const steps = [
  'Be asked the next check that tells most for its minutes.',
  'See which causes lead, and the reasons for and against each.',
  'Repair what was found, and watch it until it is proven.',
];

export default function Home() {
  return (
    <div className="grid items-center gap-x-14 gap-y-8 pt-8 lg:grid-cols-[9fr_13fr]">
      <div>
        <h1 className="text-[clamp(2.5rem,1.9rem+3vw,4.25rem)] leading-[0.98]">Before anybody fits another compressor</h1>
        <p className="mt-5 max-w-prose text-lg">Find out why this one passes oil or fails, then prove that the repair held.</p>
        <p className="mt-3 max-w-prose text-ink-soft">
          Oil at the dryer often comes from a choked drain, a carboned discharge line, a collapsed intake hose or a system that leaks.
          A new compressor on the same fault goes the way of the old one.
        </p>
        <div className="mt-7">
          <ButtonLink href="/sign-in" wide>Sign in</ButtonLink>
        </div>
      </div>
      <figure className="keep">
        <OilPathDrawing className="h-auto w-full" />
        <figcaption className="mt-2 flex flex-wrap items-center gap-x-6 gap-y-1 text-[0.9375rem] text-ink-soft">
          <Key words="Air line" />
          <Key className="bg-oil-fill" words="Oil line" />
          <span>They meet at the cylinder.</span>
        </figcaption>
      </figure>
      <ol className="grid border-t border-ink lg:col-span-2 lg:grid-cols-3 lg:gap-x-10">
        {steps.map((step, index) => (
          <li key={step} className="flex items-baseline gap-4 border-b border-rule py-3 lg:border-b-0">
            <span aria-hidden="true" className="figure text-2xl">{index + 1}</span>
            <span>{step}</span>
          </li>
        ))}
      </ol>
    </div>
  );
}

/** The lines as the drawing has them: air between two lines of ink, oil in its own colour between the same. */
function Key({ className, words }: { className?: string; words: string }) {
  return (
    <span className="inline-flex items-center gap-2">
      <span aria-hidden="true" className={classes('h-2.5 w-8 border-y-2 border-ink', className)} />
      {words}
    </span>
  );
}
