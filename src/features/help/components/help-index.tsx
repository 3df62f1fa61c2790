import { useId } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import type { Severity } from '#shared/checks/check';
import type { CheckId } from '#shared/checks/check-ids';
import { CHECKS } from '#shared/checks/registry';
import { CHECK_HELP } from '#shared/words/en/check-help';
import { SEVERITY_WORDS } from '#shared/words/en/notes';
import { SeverityMark } from '@/components/severity-mark';
import { findChecks } from '../model';

const GROUPS: readonly (readonly [Severity, string])[] = [
  ['stop', 'something would be spoiled'],
  ['fix', 'something is wrong, nothing is lost yet'],
  ['consider', 'a matter of taste or of care'],
];

/** Every check by what it stops, with a search over all that its page says. */
export function HelpIndex() {
  const [params, setParams] = useSearchParams();
  const searchId = useId();
  const query = params.get('find') ?? '';
  const found = findChecks(query);
  return (
    <main className="help">
      <h1 className="text-32 max-sm:text-24">Help</h1>
      <p className="help-lead">
        Every note that stands beside your pages comes from one of these checks. Each has a page that says why, when it speaks and where the rule comes from, with a
        spread that gets it wrong and one that gets it right.
      </p>
      <p className="mt-2">
        <Link to="/help/weight">How weight and the measures on the rule are reckoned</Link>
      </p>
      <div role="search" className="help-search">
        <label htmlFor={searchId}>Find</label>
        <input
          id={searchId}
          type="search"
          className="field-input"
          value={query}
          maxLength={80}
          onChange={(event) => setParams(event.target.value === '' ? {} : { find: event.target.value }, { replace: true })}
        />
        <span role="status">{found.length === 1 ? '1 check' : `${found.length} checks`}</span>
      </div>
      {found.length === 0 && <p>No check speaks of all of these words. Try fewer, or another.</p>}
      {GROUPS.map(([severity, words]) => (
        <HelpGroup key={severity} severity={severity} words={words} ids={found.filter((id) => CHECKS[id].severity === severity)} />
      ))}
    </main>
  );
}

function HelpGroup({ severity, words, ids }: { readonly severity: Severity; readonly words: string; readonly ids: readonly CheckId[] }) {
  if (ids.length === 0) return null;
  return (
    <section className={`help-group is-${severity}`}>
      <h2>
        <SeverityMark severity={severity} />
        {SEVERITY_WORDS[severity]}
        <span>{words}</span>
      </h2>
      <ul>
        {ids.map((id) => (
          <li key={id}>
            <Link to={`/help/checks/${id}`}>{CHECK_HELP[id].name}</Link>
            <p>{CHECK_HELP[id].rule}</p>
          </li>
        ))}
      </ul>
    </section>
  );
}
