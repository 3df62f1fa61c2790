import { useMemo, useState } from 'react';
import { Link } from 'react-router-dom';
import { NGO_MEASURES } from '#shared/checks/balance/ngo-measures';
import type { SpreadView } from '#shared/checks/check';
import { readRule, type RuleFrame, type RuleReading } from '#shared/checks/rule-reading';
import { MEASURE_HELP, measureSentence, type RuleMeasure } from '#shared/words/en/measures';

const FRAMES: readonly (readonly [RuleFrame, string])[] = [
  ['spread', 'Spread'],
  ['left', 'Left page'],
  ['right', 'Right page'],
];
const MEASURES: readonly RuleMeasure[] = ['deviation', ...NGO_MEASURES];

/** What the published measures say of the spread or of one page: a bar, the formula, and a plain sentence for each. */
export function RulePanel({ view }: { readonly view: SpreadView }) {
  const [frame, setFrame] = useState<RuleFrame>('spread');
  const reading = useMemo(() => readRule(view, frame), [view, frame]);
  const frames = FRAMES.filter(([id]) => id === 'spread' || view.doc.pages[id] !== null);
  return (
    <div className="rule-panel">
      <h2>On the rule</h2>
      <p>
        What published measures say of this spread. They judge boxes, not pictures: a second opinion, and never a note.{' '}
        <Link to="/help/weight" target="_blank" aria-label="How they are reckoned (opens in a new tab)">
          How they are reckoned
        </Link>
      </p>
      {frames.length > 2 && (
        <div className="rule-frames" role="group" aria-label="Measured">
          {frames.map(([id, label]) => (
            <button key={id} type="button" className="opt" aria-pressed={frame === id} onClick={() => setFrame(id)}>
              {label}
            </button>
          ))}
        </div>
      )}
      {reading ? (
        <ul>
          {MEASURES.map((measure) => (
            <Measure key={measure} measure={measure} reading={reading} />
          ))}
        </ul>
      ) : (
        <p>There are no mats to measure here yet.</p>
      )}
    </div>
  );
}

/** Past this much deviation the bar is full: the centre lies at the middle of an edge. */
const FULL_DEVIATION = 100;

function Measure({ measure, reading }: { readonly measure: RuleMeasure; readonly reading: RuleReading }) {
  const { name, formula } = MEASURE_HELP[measure];
  const value = measure === 'deviation' ? reading.deviation : reading.measures[measure];
  const share = value === null ? 0 : measure === 'deviation' ? Math.min(1, value / FULL_DEVIATION) : value;
  return (
    <li>
      <h3>{name}</h3>
      <RuleBar share={share} />
      <span className="num">{value === null ? '–' : measure === 'deviation' ? `${value.toFixed(1)} %` : value.toFixed(2)}</span>
      <p>{measureSentence(measure, reading)}</p>
      <p className="rule-formula">{formula}</p>
    </li>
  );
}

const BAR = 120;

/** A rule with a tick every tenth, inked as far as the measure goes. */
function RuleBar({ share }: { readonly share: number }) {
  const ticks = Array.from({ length: 11 }, (_, i) => `M${0.5 + (i * (BAR - 1)) / 10} 10v${i % 5 === 0 ? -6 : -3}`).join('');
  return (
    <svg className="rule-bar" width={BAR} height="12" viewBox={`0 0 ${BAR} 12`} aria-hidden="true">
      <path className="rule-ticks" d={ticks} />
      <path className="rule-line" d={`M0 10.5H${BAR}`} />
      <path className="rule-ink" d={`M0 9H${share * BAR}`} />
    </svg>
  );
}
