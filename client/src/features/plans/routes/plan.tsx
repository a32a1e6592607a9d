import '../components/plan.css';
import type { Case } from '@weighhouse/shared/contracts/cases';
import type { PersonRef } from '@weighhouse/shared/contracts/common';
import type { PlanView } from '@weighhouse/shared/contracts/plans';
import { Outlet } from 'react-router-dom';
import { EmptyState } from '../../../components/empty-state';
import { Failure } from '../../../components/failure';
import { SkeletonText } from '../../../components/skeleton';
import { useCase, useCaseId } from '../../cases/api/get-case';
import { useDifferential } from '../../differential/api/get-differential';
import { useSignedIn } from '../../people/api/get-me';
import { usePlan } from '../api/get-plan';
import { DraftReading } from '../components/draft-reading';
import { Downloads } from '../components/downloads';
import { PlanEditor } from '../components/plan-editor';
import { SignedPlan } from '../components/signed-plan';
import { StandingAside } from '../components/standing-aside';
import { planTitle } from '../model/plan-words';

/** The plan section of a case: the draft, the signed plans, and the outcome as its child route. */
export default function PlanSection() {
  const caseId = useCaseId();
  const plan = usePlan(caseId);
  const ofCase = useCase(caseId);
  const error = plan.error ?? ofCase.error;
  if (plan.data && ofCase.data) return <Loaded view={plan.data} ofCase={ofCase.data} />;
  return (
    <div className="plan-section">
      {error ? (
        <Failure
          error={error}
          what="The plan could not be loaded."
          retry={() => {
            void plan.refetch();
            void ofCase.refetch();
          }}
        />
      ) : (
        <SkeletonText lines={10} />
      )}
    </div>
  );
}

function Loaded({ view, ofCase }: { view: PlanView; ofCase: Case }) {
  const { id: meId } = useSignedIn();
  const working = ofCase.state === 'accepted' || ofCase.state === 'judging';
  const { draft, signed, abilities } = view;
  const writes = abilities.includes('plan.write');
  const number = draft?.number ?? (signed[0]?.number ?? 0) + 1;
  return (
    <div className="plan-section">
      <h2 className="plan-title">{planTitle(view, working)}</h2>
      {(writes || draft) && (
        <div className="plan-work">
          <StandingAside caseId={ofCase.id} />
          {writes ? (
            <Editor key={number} view={view} ofCase={ofCase} number={number} />
          ) : (
            draft && (
              <DraftReading
                caseId={ofCase.id}
                plan={draft}
                meId={meId}
                mayAnswer={abilities.includes('plan.stance')}
              />
            )
          )}
        </div>
      )}
      {!writes && !draft && signed.length === 0 && (
        <EmptyState title="Nothing to read here yet">
          The chair writes the plan when the panel has judged. You see it here as soon as it is there.
        </EmptyState>
      )}
      {signed.map((plan, place) => (
        <SignedPlan key={plan.id} caseId={ofCase.id} plan={plan} meId={meId} newest={place === 0} />
      ))}
      {signed.length > 0 && (
        <Downloads caseId={ofCase.id} number={ofCase.number} abilities={ofCase.abilities} />
      )}
      <Outlet />
    </div>
  );
}

function Editor({ view, ofCase, number }: { view: PlanView; ofCase: Case; number: number }) {
  const differential = useDifferential(ofCase.id);
  const candidates = (differential.data?.candidates ?? []).filter(
    (one) => !one.retired || one.id === view.draft?.candidateId,
  );
  return (
    <PlanEditor
      caseId={ofCase.id}
      view={view}
      number={number}
      people={teamOf(ofCase)}
      candidates={candidates}
    />
  );
}

/** Everybody on the team, once. */
function teamOf(ofCase: Case): PersonRef[] {
  return [...new Map(ofCase.team.map(({ person }) => [person.id, person])).values()];
}
