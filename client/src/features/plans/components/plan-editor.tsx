import type { PersonRef } from '@weighhouse/shared/contracts/common';
import type { Plan, PlanView } from '@weighhouse/shared/contracts/plans';
import { useMemo } from 'react';
import { BothTexts } from '../../../components/both-texts';
import { ErrorSummary } from '../../../components/error-summary';
import { FailureLine } from '../../../components/failure';
import { SaveState } from '../../../components/save-state';
import { staleDraft, useSavePlan } from '../api/save-plan';
import type { DraftKind } from '../../../lib/draft-keeper';
import { useDraftKeeper } from '../../../lib/use-draft-keeper';
import {
  adoptIds,
  draftOf,
  inputOf,
  isWhole,
  keptPlanSchema,
  type PlanDraft,
  rebaseDraft,
  sameDraft,
} from '../model/plan-draft';
import { planLabels } from '../model/missing-words';
import { ActionsEditor } from './actions-editor';
import { AskPanel } from './ask-panel';
import { ConcludePanel } from './conclude-panel';
import { DraftText } from './draft-text';
import { type Choice, DiagnosisFields, LongField } from './plan-fields';

interface Props {
  caseId: string;
  view: PlanView;
  /** The number that this plan will get. */
  number: number;
  /** The team, who can own actions. */
  people: readonly PersonRef[];
  candidates: readonly Choice[];
}

/** The chair writes the plan; it is saved while it is typed. */
export function PlanEditor({ caseId, view, number, people, candidates }: Props) {
  const save = useSavePlan(caseId);
  const stored = useMemo(() => storedOf(view.draft), [view.draft]);
  const kind = (): DraftKind<PlanDraft> => ({
    keptKey: `plan.${caseId}.${String(number)}`,
    readKept: (left) => keptPlanSchema.safeParse(left).data ?? null,
    same: sameDraft,
    save: async (value, version) => storedOf(await save(inputOf(value, version))),
    readTheirs: (error) => {
      const theirs = staleDraft(error);
      return theirs && storedOf(theirs);
    },
    adopt: adoptIds,
    rebase: rebaseDraft,
    whole: isWhole,
  });
  const { keeper, value, saving, error, theirs } = useDraftKeeper(kind, stored);
  const owners = useMemo(() => withOwners(people, view.draft), [people, view.draft]);
  const fields = {
    draft: value,
    faults: error?.fields ?? [],
    onChange: (next: PlanDraft) => {
      keeper.change(next);
    },
  };
  return (
    <div className="plan-main">
      {theirs && (
        <BothTexts
          what="the plan"
          mine={<DraftText draft={value} people={owners} />}
          theirs={<DraftText draft={theirs.value} people={owners} />}
          onKeepMine={() => {
            keeper.keepMine();
          }}
          onTakeTheirs={() => {
            keeper.takeTheirs();
          }}
        />
      )}
      <form
        className="plan-form"
        onSubmit={(event) => {
          event.preventDefault();
        }}
      >
        <ErrorSummary faults={fields.faults} labels={planLabels} title="This could not be saved yet" />
        {error && error.fields.length === 0 && error.status !== 0 && <FailureLine error={error} />}
        <DiagnosisFields {...fields} candidates={candidates} />
        <LongField {...fields} name="remainingDoubt" />
        <ActionsEditor {...fields} people={owners} />
        <LongField {...fields} name="safetyNet" />
        <p className="plan-saved">
          <SaveState saving={saving} />
        </p>
      </form>
      <AskPanel caseId={caseId} view={view} save={() => keeper.flush()} />
      <ConcludePanel caseId={caseId} view={view} number={number} save={() => keeper.flush()} />
    </div>
  );
}

const storedOf = (plan: Plan | null) => ({ version: plan?.version ?? 0, value: draftOf(plan) });

/** The team, and whoever owns an action although they have left it. */
function withOwners(people: readonly PersonRef[], draft: Plan | null): PersonRef[] {
  const all = new Map(people.map((person) => [person.id, person]));
  for (const { owner } of draft?.actions ?? []) if (owner && !all.has(owner.id)) all.set(owner.id, owner);
  return [...all.values()];
}
