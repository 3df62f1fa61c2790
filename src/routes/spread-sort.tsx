import { useQuery } from '@tanstack/react-query';
import { Suspense, useEffect, useMemo } from 'react';
import { useOutletContext } from 'react-router-dom';
import type { SpreadDetail } from '#shared/contracts/albums';
import type { CommandCall } from '#shared/commands/calls';
import { reasonSentence } from '#shared/words/en/commands';
import { useAnnounce } from '@/components/live-region';
import { useComposer, useComposerStore } from '@/features/composer/hooks/composer-context';
import { printsQuery } from '@/features/prints/api/print-queries';
import { SortView } from '@/features/prints/components/sort-view';
import { useMay } from '@/lib/session';

/** The Sort stage: the studio's prints, and which of them are meant for this spread. */
export function Component() {
  const detail = useOutletContext<SpreadDetail>();
  const store = useComposerStore();
  const table = useComposer(({ doc }) => doc.table);
  const format = useComposer(({ doc }) => doc.format);
  const reveal = useComposer(({ doc }) => doc.reveal);
  const { data: prints = [] } = useQuery(printsQuery(detail.studioId));
  const announce = useAnnounce();
  const may = useMay();
  const onTable = useMemo(() => new Set(table), [table]);

  // A size or keep zone set here must reach the notes and the windows of the open spread.
  useEffect(() => {
    const { prints: known, putPrints } = store.getState();
    putPrints(prints.filter((print) => known.has(print.id) && known.get(print.id)?.revision !== print.revision));
  }, [prints, store]);

  const setOnTable = (printIds: readonly string[], on: boolean): string | null => {
    const changed = printIds.filter((id) => onTable.has(id) !== on);
    const { putPrints, whyNot, run } = store.getState();
    if (on) putPrints(prints.filter(({ id }) => changed.includes(id)));
    const call: CommandCall = { id: on ? 'table.add' : 'table.remove', args: { printIds: changed } };
    const reason = whyNot(call);
    if (reason !== null) return reasonSentence(reason);
    run(call);
    const after = new Set(store.getState().doc.table);
    const done = changed.filter((id) => after.has(id) === on);
    const count = `${done.length} ${done.length === 1 ? 'print' : 'prints'}`;
    announce(on ? `${count} chosen for this spread` : `${count} put away`);
    // Those that lie on a mat stay, while the rest of their pile goes.
    return done.length < changed.length ? reasonSentence('still-placed') : null;
  };
  return (
    <main>
      <title>{`Sort · ${detail.title} · Pairleaf`}</title>
      <h1 className="sr-only">Sort prints for {detail.title}</h1>
      <Suspense fallback={<p className="p-6 text-ink-2">Laying out…</p>}>
        <SortView
          studioId={detail.studioId}
          sizing={{ format, reveal, trim: detail.trim, unit: detail.unit }}
          mayEdit={detail.may.edit && may('print:edit', { studioId: detail.studioId })}
          mayDelete={may('print:delete', { studioId: detail.studioId })}
          onTable={onTable}
          setOnTable={setOnTable}
        />
      </Suspense>
    </main>
  );
}
