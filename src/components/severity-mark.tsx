import type { Severity } from '#shared/checks/check';

/** The drawn mark of a note: a barred square to stop, a caret to fix, a ring to consider. Its word stands beside it. */
export function SeverityMark({ severity }: { readonly severity: Severity }) {
  if (severity === 'stop') {
    return (
      <svg viewBox="0 0 13 13" width="13" height="13" aria-hidden="true" className="flex-none">
        <path className="mark-square" d="M.5.5h12v12H.5z" />
        <path className="mark-bar" d="M3 6.5h7" />
      </svg>
    );
  }
  return (
    <svg viewBox="0 0 13 13" width="13" height="13" aria-hidden="true" className="mark-line flex-none">
      {severity === 'fix' ? <path d="M1 12 6.5 1.5 12 12" /> : <circle cx="6.5" cy="6.5" r="5" />}
    </svg>
  );
}
