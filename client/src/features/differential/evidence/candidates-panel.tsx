import { Button } from '@radix-ui/themes';
import type { Candidate } from '@weighhouse/shared/contracts/findings';
import { useState } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { useLedger } from '../ledger/ledger-context';
import { columnLetter } from '../model/columns';
import { useRetireCandidate } from '../../findings/api/retire-candidate';
import { CandidateForm } from './candidate-form';
import './findings.css';

/** The candidates of the differential: add one, retire one. */
export function CandidatesPanel() {
  const { differential, may } = useLedger();
  const [retiring, setRetiring] = useState<Candidate | null>(null);
  const retire = useRetireCandidate(differential.caseId);
  const inForce = differential.candidates.filter((candidate) => !candidate.retired);
  const retired = differential.candidates.filter((candidate) => candidate.retired);
  return (
    <>
      <h2 className="side-heading" tabIndex={-1}>
        Candidates
      </h2>
      <p className="side-about">
        Adding or retiring one makes the next candidate set: everybody gives their prior again, and
        likelihoods of the other columns stay.{' '}
        {differential.sealed && 'While a round is sealed the set is frozen.'}
      </p>
      <ul className="candidate-list">
        {inForce.map((candidate, index) => (
          <li key={candidate.id}>
            <span>
              {columnLetter(index)} {candidate.name}
              {candidate.mustNotMiss && <span className="small"> (must not miss)</span>}
              {candidate.detail !== '' && (
                <span className="small soft candidate-detail">{candidate.detail}</span>
              )}
              <span className="small soft candidate-detail">Added by {candidate.addedBy}</span>
            </span>
            {may('candidate.retire') && (
              <Button
                variant="outline"
                aria-label={`Retire ${candidate.name}`}
                onClick={() => {
                  setRetiring(candidate);
                }}
              >
                Retire
              </Button>
            )}
          </li>
        ))}
        <li>
          <span>None of these</span>
          <span className="small soft">always the last</span>
        </li>
      </ul>
      {retired.length > 0 && (
        <>
          <h3 className="side-sub">Retired</h3>
          <ul className="side-list">
            {retired.map((candidate) => (
              <li key={candidate.id}>
                {candidate.name}
                {candidate.retiredWords !== null && <span className="soft">: {candidate.retiredWords}</span>}
              </li>
            ))}
          </ul>
        </>
      )}
      {may('candidate.add') && <CandidateForm caseId={differential.caseId} />}
      {retiring && (
        <ConfirmDialog
          open
          onOpenChange={(open) => {
            if (!open) setRetiring(null);
          }}
          title={`Retire ${retiring.name}`}
          verb="Retire it"
          wordsLabel="Why"
          wordsOptional
          onConfirm={({ words }) => retire.mutateAsync({ candidateId: retiring.id, words })}
        >
          Its column goes, and everybody is asked for their prior again.
        </ConfirmDialog>
      )}
    </>
  );
}
