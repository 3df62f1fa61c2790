import { useMemo } from 'react';
import { Link } from 'react-router-dom';
import type { Note } from '#shared/checks/check';
import { CHECK_IDS, type CheckId } from '#shared/checks/check-ids';
import { CHECK_EXAMPLES } from '#shared/checks/examples/check-examples';
import type { ExampleSpread } from '#shared/checks/examples/parts';
import { CHECKS } from '#shared/checks/registry';
import { runChecks } from '#shared/checks/run-checks';
import { viewSpread } from '#shared/checks/view-spread';
import { TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';
import { CHECK_HELP } from '#shared/words/en/check-help';
import { SEVERITY_WORDS, noteSentence } from '#shared/words/en/notes';
import { SeverityMark } from '@/components/severity-mark';
import { basisWords, thresholdWords } from '../model';
import { ExampleDrawing } from './example-drawing';

/** One check: a wrong and a right spread, why, when it speaks, where it comes from, what can be set. */
export function CheckPage({ id }: { readonly id: CheckId }) {
  const check = CHECKS[id];
  const help = CHECK_HELP[id];
  const { wrong, right } = CHECK_EXAMPLES[id];
  const note = useMemo(() => noteOn(wrong, id), [wrong, id]);
  const sentence = note ? noteSentence(note, wrong.doc.format.unit) : '';
  const isWide = wrong.doc.pages.left !== null && wrong.doc.pages.right !== null;
  return (
    <main className="help">
      <p className={`help-severity is-${check.severity}`}>
        <SeverityMark severity={check.severity} />
        {SEVERITY_WORDS[check.severity]}
      </p>
      <h1 className="text-32 max-sm:text-24">{help.name}</h1>
      <p className="help-lead">{help.why}</p>
      <div className={`help-examples ${isWide ? 'is-wide' : ''}`}>
        <figure>
          <ExampleDrawing spread={wrong} label={`Wrong: ${sentence}`} noted={note?.matIds} />
          <figcaption>
            <b>
              <WrongMark /> Wrong
            </b>
            <span className="help-note">{sentence}</span>
          </figcaption>
        </figure>
        <figure>
          <ExampleDrawing spread={right} label={`Right: ${help.right}`} />
          <figcaption>
            <b>
              <RightMark /> Right
            </b>
            <span>{help.right}</span>
          </figcaption>
        </figure>
      </div>
      <dl className="help-facts">
        <dt>When it speaks</dt>
        <dd>
          {help.rule}
          {check.needsFilledPages && ' It keeps silent while pages are half filled.'}
        </dd>
        <dt>Where it comes from</dt>
        <dd>{basisWords(check)}</dd>
        {Object.entries(check.thresholds).map(([name, threshold]) => (
          <Threshold key={name} name={help.thresholds?.[name] ?? name} value={thresholdWords(threshold.default, threshold)} from={thresholdWords(threshold.min, threshold)} to={thresholdWords(threshold.max, threshold)} />
        ))}
      </dl>
      <Neighbours id={id} />
    </main>
  );
}

function Threshold({ name, value, from, to }: { readonly name: string; readonly value: string; readonly from: string; readonly to: string }) {
  return (
    <>
      <dt>{name}</dt>
      <dd>
        <span className="num">{value}</span> unless set, between <span className="num">{from}</span> and <span className="num">{to}</span>
      </dd>
    </>
  );
}

function Neighbours({ id }: { readonly id: CheckId }) {
  const place = CHECK_IDS.indexOf(id);
  const before = CHECK_IDS[place - 1];
  const after = CHECK_IDS[place + 1];
  return (
    <nav className="help-neighbours" aria-label="Other checks">
      {before && <Link to={`/help/checks/${before}`}>‹ {CHECK_HELP[before].name}</Link>}
      <Link to="/help">All checks</Link>
      {after && <Link to={`/help/checks/${after}`}>{CHECK_HELP[after].name} ›</Link>}
    </nav>
  );
}

const WrongMark = () => (
  <svg viewBox="0 0 13 13" width="13" height="13" aria-hidden="true" className="wrong-mark">
    <path d="m2 2 9 9M11 2l-9 9" />
  </svg>
);
const RightMark = () => (
  <svg viewBox="0 0 13 13" width="13" height="13" aria-hidden="true" className="right-mark">
    <path d="m1.5 7 3.5 4L11.5 2" />
  </svg>
);

/** What the check says of its wrong example. */
function noteOn({ doc, prints }: ExampleSpread, id: CheckId): Note | undefined {
  const view = viewSpread({ doc, prints: new Map(prints.map(({ print }) => [print.id, print])), trim: TRIM_SETTINGS_INCH, usedElsewhere: {} });
  return runChecks(view).find(({ checkId }) => checkId === id);
}
