import { movingCases, stillCases } from '#core/accuracy/error-statistics.ts';
import { movingShare, stillShares } from '#core/accuracy/model-error.ts';
import { publishedAccuracy } from '#core/accuracy/published-accuracy.ts';
import { deference, notCovered } from '#core/record/method-limits.ts';
import { methodVersion } from '#core/thermal/method.ts';
import { Page } from '#web/ui/page.tsx';
import { AccuracyPlot } from './accuracy-plot.tsx';
import { CaseTable } from './case-table.tsx';
import { FamilyTable } from './family-table.tsx';
import { parts } from './method-parts.ts';
import { percent } from './percent.ts';

const prose = 'max-w-prose mb-4';
const heading = 'mt-12 mb-4 text-xl';

/** How a temperature is made, against what it was checked, and where it does not hold. */
export function Component() {
  const still = stillCases(publishedAccuracy);
  return (
    <Page title="Method">
      <p className={prose}>
        Method {methodVersion}. Every junction is given with a band: one standard deviation of the grid error and the
        model error together. The model error comes from the boards below, all run by one convention; nothing was tuned
        to a single one.
      </p>
      <h2 className={heading}>What is calculated</h2>
      <dl className="grid max-w-5xl gap-x-8 gap-y-3 md:grid-cols-[12rem_1fr]">
        {parts.map(({ name, text, source, range }) => (
          <div key={name} className="contents">
            <dt className="font-semibold">{name}</dt>
            <dd className="mb-3 max-w-prose">
              {text} <span className="text-sm text-ink-soft">{source}</span>
              {range === null ? null : <span className="block text-sm text-ink-soft">Range: {range}</span>}
            </dd>
          </div>
        ))}
      </dl>
      <h2 className={heading}>How far off it was</h2>
      <p className={prose}>
        {still.length} boards in still air whose sources do not contradict themselves. A minus says that the method came
        out too cool.
      </p>
      <FamilyTable still={still} moving={movingCases(publishedAccuracy)} />
      <h2 className={heading}>What is stated as model error</h2>
      <p className={prose}>
        By the way a package hands its heat to the board, as a share of the rise: a tab beside the body{' '}
        {percent(stillShares.tab)}, a pad under the body {percent(stillShares.pad)}, leads alone{' '}
        {percent(stillShares.leads)}; anything else on the board {percent(stillShares.all)}. Where boards of a kind are
        few, their error is drawn towards that of all. In moving air only a handful of boards are published, so double
        their error is stated: {percent(movingShare)}. A film that is entered by hand carries no correlation; 5.0 % are
        stated, an estimate.
      </p>
      <h2 className={heading}>Every board</h2>
      <div className="mb-8">
        <AccuracyPlot cases={publishedAccuracy} />
      </div>
      <CaseTable cases={publishedAccuracy} />
      <h2 className={heading}>What it does not cover</h2>
      <ul className="max-w-prose list-disc space-y-2 pl-5">
        {notCovered.map((item) => (
          <li key={item}>{item}</li>
        ))}
      </ul>
      <h2 className={heading}>What takes precedence</h2>
      {deference.map((text) => (
        <p key={text} className={prose}>
          {text}
        </p>
      ))}
    </Page>
  );
}
