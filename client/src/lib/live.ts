import { type QueryClient, useQueryClient } from '@tanstack/react-query';
import type { Differential } from '@weighhouse/shared/contracts/differential';
import {
  type CaseAssessment,
  type CaseChanged,
  type CaseStanding,
  caseAssessmentSchema,
  caseChangedSchema,
  casePresentSchema,
  caseStandingSchema,
  liveEvents,
} from '@weighhouse/shared/contracts/live';
import { useEffect, useState, useSyncExternalStore } from 'react';
import { liveConnection, type LiveState } from './live-connection';
import { isGap, staleParts, touchesLists } from './live-keys';

/** Makes everything that was read of a case old, so that the screen is right again after a gap or a reconnection. */
function refetchCase(client: QueryClient, caseId: string): void {
  void client.invalidateQueries({ queryKey: ['case', caseId] });
  void client.invalidateQueries({ queryKey: ['today'] });
  void client.invalidateQueries({ queryKey: ['cases'] });
}

function takeChange(client: QueryClient, { caseId, what }: CaseChanged): void {
  for (const part of staleParts(what)) void client.invalidateQueries({ queryKey: ['case', caseId, part] });
  if (!touchesLists(what)) return;
  void client.invalidateQueries({ queryKey: ['today'] });
  void client.invalidateQueries({ queryKey: ['cases'] });
}

/** Puts a pushed standing on the screen at once; the rest of the assessment follows with the refetch. */
function takeStanding(client: QueryClient, event: CaseStanding): void {
  const key = ['case', event.caseId, 'differential'];
  client.setQueryData<Differential>(key, (known) => {
    if (!known?.assessment || known.sealed || known.candidateSet !== event.candidateSet) return known;
    if (known.revision >= event.revision) return known;
    return { ...known, assessment: { ...known.assessment, standing: event.standing } };
  });
  void client.invalidateQueries({ queryKey: key });
  void client.invalidateQueries({ queryKey: ['case', event.caseId, 'panel'] });
}

/** Puts the rest of an assessment that took its time on the screen; what was fetched meanwhile is as new. */
function takeAssessment(client: QueryClient, event: CaseAssessment): void {
  client.setQueryData<Differential>(['case', event.caseId, 'differential'], (known) => {
    if (!known?.assessment || known.sealed || known.candidateSet !== event.candidateSet) return known;
    return known.revision >= event.revision ? known : { ...known, assessment: event.assessment };
  });
}

/**
 * Keeps a case's queries right while it is on the screen: joins its room, takes its events, and refetches everything
 * through the guarded API after a reconnection or a missed revision.
 */
export function useWatchCase(caseId: string): void {
  const client = useQueryClient();
  useEffect(() => {
    let last: number | undefined;
    let joined = false;
    const join = () => {
      void liveConnection.emit(liveEvents.watch, { caseId });
      // What changed between reading the case and joining its room was announced to nobody here.
      if (joined) last = undefined;
      joined = true;
      refetchCase(client, caseId);
    };
    const seen = (revision: number) => {
      const gap = isGap(last, revision);
      last = Math.max(last ?? 0, revision);
      if (gap) refetchCase(client, caseId);
      return !gap;
    };
    const stop = [
      liveConnection.onConnect(join),
      liveConnection.on(liveEvents.changed, (payload) => {
        const event = caseChangedSchema.safeParse(payload);
        if (event.success && event.data.caseId === caseId && seen(event.data.revision))
          takeChange(client, event.data);
      }),
      liveConnection.on(liveEvents.standing, (payload) => {
        const event = caseStandingSchema.safeParse(payload);
        if (event.success && event.data.caseId === caseId) {
          seen(event.data.revision);
          takeStanding(client, event.data);
        }
      }),
      liveConnection.on(liveEvents.assessment, (payload) => {
        const event = caseAssessmentSchema.safeParse(payload);
        // One that was overtaken on the way would take the newer standing off the screen again.
        if (event.success && event.data.caseId === caseId && event.data.revision >= (last ?? 0))
          takeAssessment(client, event.data);
      }),
    ];
    void liveConnection.whenConnected().then((now) => {
      if (now && !joined) join();
    });
    return () => {
      for (const end of stop) end();
      if (joined) void liveConnection.emit(liveEvents.unwatch, { caseId });
    };
  }, [client, caseId]);
}

/** Whether live changes arrive at the moment. */
export function useLiveState(): LiveState {
  return useSyncExternalStore(liveConnection.subscribe, liveConnection.state);
}

/** How many people have the case open now, oneself included; null until the server said so. */
export function usePresent(caseId: string): number | null {
  const [known, setKnown] = useState<{ caseId: string; people: number } | null>(null);
  useEffect(
    () =>
      liveConnection.on(liveEvents.present, (payload) => {
        const event = casePresentSchema.safeParse(payload);
        if (event.success) setKnown(event.data);
      }),
    [],
  );
  return known?.caseId === caseId ? known.people : null;
}
