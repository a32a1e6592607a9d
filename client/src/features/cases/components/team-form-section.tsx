import { Button } from '@radix-ui/themes';
import type { Case } from '@weighhouse/shared/contracts/cases';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { type SubmitEvent, useState } from 'react';
import { ErrorSummary } from '../../../components/error-summary';
import { FailureLine } from '../../../components/failure';
import { isApiError } from '../../../lib/api';
import { useSetTeam } from '../api/set-team';
import { TeamEditor } from './team-editor';
import { inputOf, type Seat, seatsOf, stillWrong, teamFaults } from './team-form';
import { labelsOf } from './team-labels';

/** Changing the team of a case that is under way. */
export function TeamForm({ of }: { of: Case }) {
  const save = useSetTeam(of.id);
  const [seats, setSeats] = useState(() => seatsOf(of.team));
  const [faults, setFaults] = useState<FieldFault[]>([]);
  const sealed = of.round?.open === true && of.round.kind === 'sealed';

  const changeSeats = (next: Seat[]) => {
    setSeats(next);
    setFaults((known) => stillWrong(known, next));
  };

  const submit = async (event: SubmitEvent) => {
    event.preventDefault();
    const found = teamFaults(seats);
    setFaults(found);
    if (found.length > 0) return;
    try {
      const saved = await save.mutateAsync(inputOf(seats));
      setSeats(seatsOf(saved.items));
    } catch (error) {
      if (isApiError(error)) setFaults(error.fields);
    }
  };

  return (
    <form onSubmit={(event) => void submit(event)} noValidate>
      <h2 className="form-title">The team of this case</h2>
      <p className="soft prose">
        {sealed
          ? 'A sealed round is open: weights stay as they are until it is unsealed. People can join and leave.'
          : 'A changed weight moves the pool at once. Everybody on the team can read the weights and their reasons.'}
      </p>
      <ErrorSummary faults={faults} labels={labelsOf(seats)} title="The team was not saved" />
      <TeamEditor seats={seats} faults={faults} weightsFrozen={sealed} onSeats={changeSeats} />
      {faults.length === 0 && <FailureLine error={save.error} />}
      <div className="actions team-rest">
        <Button type="submit" loading={save.isPending}>
          Save the team
        </Button>
        <span role="status">{save.isSuccess ? 'The team is saved.' : ''}</span>
      </div>
    </form>
  );
}
