import { useState, type FormEvent } from 'react';
import type { CheckId } from '#shared/checks/check-ids';
import { joinSettings } from '#shared/checks/join-settings';
import { CHECKS } from '#shared/checks/registry';
import { CHECK_NAMES, LIMIT_NAMES } from '#shared/words/en/checks';
import { limitText, limitUnit, limitWords, readLimit } from '#shared/words/limits';
import { Button } from '@/components/button';
import { Dialog } from '@/components/dialog';
import { Field } from '@/components/field';
import { useComposer } from '@/features/composer/hooks/composer-context';
import { useSetCheck } from '@/features/composer/hooks/use-set-check';

interface CheckLimitDialogProps {
  readonly checkId: CheckId;
  readonly onClose: () => void;
}

const SCOPES = [
  { scope: 'spread', label: 'On this spread' },
  { scope: 'studio', label: 'In the whole studio' },
] as const;

/** Sets from where on a check speaks, on this spread or on all of the studio's. */
export function CheckLimitDialog({ checkId, onClose }: CheckLimitDialogProps) {
  const unit = useComposer((state) => state.unit);
  const checks = useComposer((state) => state.checks);
  const set = useSetCheck();
  const [name, threshold] = Object.entries(CHECKS[checkId].thresholds)[0]!;
  const now = joinSettings(checks.studio, checks.spread).thresholds?.[checkId]?.[name] ?? threshold.default;
  const [scope, setScope] = useState<'studio' | 'spread'>('spread');
  const [text, setText] = useState(() => limitText(now, threshold.unit, unit));
  const [isWorking, setIsWorking] = useState(false);
  const value = readLimit(text, threshold.unit, unit);
  const words = (limit: number): string => limitWords(limit, threshold.unit, unit);
  const isGood = value !== null && value >= threshold.min && value <= threshold.max;
  const isSetHere = checks[scope].some((setting) => setting.checkId === checkId && name in setting.thresholds);

  const save = async (thresholds: Record<string, number> | null): Promise<void> => {
    setIsWorking(true);
    const isSaved = await set(scope, checkId, { thresholds });
    setIsWorking(false);
    if (isSaved) onClose();
  };
  const handleSubmit = (event: FormEvent): void => {
    event.preventDefault();
    if (isGood) void save({ [name]: value });
  };
  return (
    <Dialog open onClose={onClose} title={CHECK_NAMES[checkId]} description="From where on this check speaks.">
      <form onSubmit={handleSubmit} noValidate>
        <Field
          label={LIMIT_NAMES[checkId] ?? 'Limit'}
          error={isGood ? undefined : `Give a number from ${words(threshold.min)} to ${words(threshold.max)}.`}
          hint={`From ${words(threshold.min)} to ${words(threshold.max)}. It is ${words(threshold.default)} unless set.`}
        >
          {(control) => (
            <span className="limit-field">
              <input {...control} className="field-input num" value={text} onChange={(event) => setText(event.target.value)} />
              <span className="num">{limitUnit(threshold.unit, unit)}</span>
            </span>
          )}
        </Field>
        <div className="export-choice mt-4" role="group" aria-label="Where it holds">
          {SCOPES.map((choice) => (
            <button key={choice.scope} type="button" className="opt" aria-pressed={scope === choice.scope} onClick={() => setScope(choice.scope)}>
              {choice.label}
            </button>
          ))}
        </div>
        <div className="export-act">
          <Button type="submit" variant="ink" disabled={!isGood} working={isWorking}>
            Set it
          </Button>
          {isSetHere && (
            <button type="button" className="link-button" onClick={() => void save(null)}>
              Unset it {scope === 'studio' ? 'in the studio' : 'here'}
            </button>
          )}
        </div>
      </form>
    </Dialog>
  );
}
