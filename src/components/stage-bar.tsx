import { Link } from 'react-router-dom';

export interface Stage {
  readonly id: string;
  readonly label: string;
  /** Null where the stage has no screen yet. */
  readonly to: string | null;
  readonly state: 'done' | 'current' | 'ahead';
}

/** The stages of a spread, standing on a steel rule. Every stage with a screen is a link, whatever is done. */
export function StageBar({ stages }: { readonly stages: readonly Stage[] }) {
  return (
    <nav aria-label="Stages" className="h-full">
      <ol className="stages">
        {stages.map(({ id, label, to, state }) => (
          <li key={id} data-state={state}>
            {to === null ? (
              <span aria-disabled="true" title="This stage is not open yet">
                {label}
              </span>
            ) : (
              <Link to={to} aria-current={state === 'current' ? 'step' : undefined}>
                {label}
                {state === 'done' && <span className="sr-only">, done</span>}
              </Link>
            )}
            <span className="ticks" aria-hidden="true" />
          </li>
        ))}
      </ol>
    </nav>
  );
}
