import { useCallback, useEffect, useState } from 'react';
import type { CommandArgs } from '#shared/commands/calls';
import type { PlacedScheme } from '#shared/colour/suggest-placed';
import type { Scheme, SpreadDocument } from '#shared/model/spread';
import { createSchemeClient, type SchemeClient } from '@/features/composer/workers/scheme-client';
import { useComposer, useComposerStore } from './composer-context';

const SETTLES_AFTER_MS = 250;

interface Schemes {
  /** Null until the first answer. */
  readonly suggestions: readonly PlacedScheme[] | null;
  /** The scheme placed on the spread as it stands now. */
  readonly place: (scheme: Scheme) => Promise<CommandArgs['scheme.apply']>;
}

/**
 * The schemes for the spread as it stood when the hand last rested, and each placed on it.
 *
 * @param isHeld - something is in the hand: what lies under it is only a preview.
 */
export function useSchemes(withSkin: boolean, isHeld: boolean): Schemes {
  const store = useComposerStore();
  const settled = useSettledDocument(isHeld);
  const prints = useComposer((state) => state.prints);
  const trim = useComposer((state) => state.trim);
  const client = useSchemeClient();
  const [answer, setAnswer] = useState<{ readonly doc: SpreadDocument; readonly suggestions: readonly PlacedScheme[] } | null>(null);
  useEffect(() => {
    if (!client) return undefined;
    let isCurrent = true;
    void client.suggest({ doc: settled, prints, trim }, { withSkin }).then((suggestions) => isCurrent && setAnswer({ doc: settled, suggestions }));
    return () => {
      isCurrent = false;
    };
  }, [client, settled, prints, trim, withSkin]);
  const place = useCallback(
    async (scheme: Scheme): Promise<CommandArgs['scheme.apply']> => {
      const known = answer?.suggestions.find((suggestion) => suggestion.scheme === scheme);
      for (;;) {
        const state = store.getState();
        if (known && answer?.doc === state.doc && state.trim === trim && state.prints === prints) return known.args;
        if (!client) throw new Error('no scheme is known before there is a client that suggested it');
        const args = await client.place(state, scheme);
        if (store.getState().doc === state.doc) return args;
      }
    },
    [store, client, answer, prints, trim],
  );
  return { suggestions: answer?.suggestions ?? null, place };
}

/** One client for as long as the schemes are shown; null at first, since its worker is started by an effect. */
function useSchemeClient(): SchemeClient | null {
  const [client, setClient] = useState<SchemeClient | null>(null);
  useEffect(() => {
    const started = createSchemeClient();
    setClient(started);
    return () => started.close();
  }, []);
  return client;
}

function useSettledDocument(isHeld: boolean): SpreadDocument {
  const doc = useComposer((state) => state.doc);
  const [settled, setSettled] = useState(doc);
  useEffect(() => {
    if (isHeld) return undefined;
    const timer = setTimeout(() => setSettled(doc), SETTLES_AFTER_MS);
    return () => clearTimeout(timer);
  }, [doc, isHeld]);
  return settled;
}
