const STEPS = [
  ['Name the production', 'and say who sits there. Heights are enough to begin with.'],
  ['Lay out the benches', 'with their tables and sills, in inches or millimetres.'],
  ['Read the fit sheet', 'and settle each height knowing whom it costs.'],
  ['Issue the revision', 'and send the cushion order to the upholsterer.'],
] as const;

/** What a first set takes. */
export function FirstSteps() {
  return (
    <section aria-labelledby="first-steps" className="mt-10">
      <h2 id="first-steps" className="pb-2 text-sm font-semibold">
        From an empty bay to an order
      </h2>
      <ol>
        {STEPS.map(([lead, rest], index) => (
          <li key={lead} className="flex gap-4 border-t border-rule py-2 text-sm">
            <span aria-hidden="true" className="w-3 shrink-0 font-semibold">
              {index + 1}
            </span>
            <span className="text-ink-2">
              <b className="font-medium text-ink">{lead}</b> {rest}
            </span>
          </li>
        ))}
      </ol>
    </section>
  );
}
