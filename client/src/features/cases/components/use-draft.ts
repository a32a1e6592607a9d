import { type QueryClient, useQueryClient } from '@tanstack/react-query';
import { type Case, caseSchema } from '@weighhouse/shared/contracts/cases';
import { useMemo, useState } from 'react';
import { z } from 'zod';
import type { DraftKind, Stored } from '../../../lib/draft-keeper';
import { useDraftKeeper } from '../../../lib/use-draft-keeper';
import { changeDraft } from '../api/draft';
import { caseQuery } from '../api/get-case';
import { changeOf, differences, type DraftForm, formOf, formSchema, merged } from './draft-form';

const keptSchema = z.object({ version: z.int(), value: formSchema });

const storedOf = (of: Case): Stored<DraftForm> => ({ version: of.version, value: formOf(of) });

/** How a referral is saved: field by field, and a field with a fault stays here until it is mended. */
function referralKind(client: QueryClient, of: Case): DraftKind<DraftForm> {
  let known = formOf(of);
  return {
    keptKey: `referral.${of.id}`,
    readKept: (kept) => keptSchema.safeParse(kept).data ?? null,
    same: (one, other) => differences(one, other).length === 0,
    save: async (value, version) => {
      const { change } = changeOf(value, new Set(differences(value, known)));
      if (Object.keys(change).length === 0) return { version, value };
      const saved = await changeDraft(of.id, version, change);
      known = formOf(saved);
      client.setQueryData(caseQuery(of.id).queryKey, saved);
      return storedOf(saved);
    },
    readTheirs: (error) => {
      const theirs = caseSchema.safeParse(error.current);
      return theirs.success ? storedOf(theirs.data) : null;
    },
    rebase: (mine, theirs) => {
      const value = merged(mine, theirs, known);
      known = theirs;
      return value;
    },
    whole: (value) => changeOf(value, new Set(differences(value, known))).faults.length === 0,
  };
}

/**
 * The referral being written, saved as it is typed. What the server has not acknowledged is also kept in this browser
 * and comes back with the page.
 */
export function useDraft(of: Case) {
  const client = useQueryClient();
  const stored = useMemo(() => storedOf(of), [of]);
  const { keeper, value, saving, error, theirs } = useDraftKeeper(() => referralKind(client, of), stored);
  const [shown, setShown] = useState({ value, fills: 0 });
  // Only what comes from elsewhere leaves the keeper clean; the editor of the history has to take it over.
  if (saving.state === 'clean' && shown.value !== value) setShown({ value, fills: shown.fills + 1 });
  return {
    form: value,
    /** Rises when the fields were filled from elsewhere. */
    fills: shown.fills,
    faults: [...changeOf(value, allFields(value)).faults, ...(error?.fields ?? [])],
    saving,
    change: (part: Partial<DraftForm>) => {
      keeper.change({ ...keeper.read().value, ...part });
    },
    flush: () => keeper.flush(),
    theirs: theirs && { form: theirs.value, differ: differences(value, theirs.value) },
    keepMine: () => {
      keeper.keepMine();
      setShown((before) => ({ ...before, fills: before.fills + 1 }));
    },
    takeTheirs: () => {
      keeper.takeTheirs();
    },
  };
}

const allFields = (form: DraftForm) => new Set(Object.keys(form) as (keyof DraftForm)[]);
