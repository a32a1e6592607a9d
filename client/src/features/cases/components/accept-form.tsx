import { Button, TextField } from '@radix-ui/themes';
import type { Case } from '@weighhouse/shared/contracts/cases';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { type SubmitEvent, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { ErrorSummary } from '../../../components/error-summary';
import { FailureLine } from '../../../components/failure';
import { FormField } from '../../../components/form-field';
import { isApiError } from '../../../lib/api';
import { useFormat } from '../../../lib/use-format';
import { useMoveCase } from '../api/move-case';
import { ConferenceField, type ConferenceTyped } from './conference-field';
import { parseQuorum, readConference } from './conference-typed';
import { TeamEditor } from './team-editor';
import { inputOf, type Seat, seatsOf, stillWrong, teamFaults } from './team-form';
import { labelsOf } from './team-labels';

/** Accepting a case: who judges it, who tells the patient, when it is discussed. The accepting chair leads it. */
export function AcceptForm({ of }: { of: Case }) {
  const format = useFormat();
  const navigate = useNavigate();
  const move = useMoveCase(of.id);
  const [seats, setSeats] = useState(() => seatsOf(of.team));
  const [conference, setConference] = useState<ConferenceTyped>({ choice: '', at: '' });
  const [quorum, setQuorum] = useState(String(of.quorum));
  const [faults, setFaults] = useState<FieldFault[]>([]);

  const changeSeats = (next: Seat[]) => {
    setSeats(next);
    setFaults((known) => stillWrong(known, next));
  };

  const submit = async (event: SubmitEvent) => {
    event.preventDefault();
    const found = teamFaults(seats);
    const date = readConference(conference, format);
    const needed = parseQuorum(quorum);
    if ('fault' in date) found.push(date.fault);
    if (needed === null) found.push({ path: 'quorum', message: 'must be a whole number from 2 to 25' });
    setFaults(found);
    if (found.length > 0 || 'fault' in date || needed === null) return;
    try {
      await move.mutateAsync({
        move: 'accept',
        body: { team: inputOf(seats), conferenceAt: date.at, quorum: needed },
      });
      await navigate(`/cases/${of.id}/differential`);
    } catch (error) {
      if (isApiError(error)) setFaults(error.fields);
    }
  };

  return (
    <form onSubmit={(event) => void submit(event)} noValidate>
      <h2 className="form-title">Accept the case with a team</h2>
      <p className="soft prose">
        You become its chair. Contributors get an e-mail with the case’s number and a link, nothing else.
      </p>
      <ErrorSummary faults={faults} labels={labelsOf(seats)} title="The case cannot be accepted yet" />
      <TeamEditor seats={seats} faults={faults} weightsFrozen={false} onSeats={changeSeats} />
      <section aria-label="Conference and quorum" className="team-rest">
        <ConferenceField
          value={conference}
          faults={faults}
          timeZone={format.timeZone}
          onChange={(typed) => {
            setConference(typed);
            setFaults((known) => known.filter((fault) => fault.path !== 'conferenceAt'));
          }}
        />
        <FormField
          label="Quorum"
          path="quorum"
          faults={faults}
          hint="How many must have handed in before a sealed round can be unsealed."
        >
          {(control) => (
            <TextField.Root
              {...control}
              className="quorum-field figures"
              inputMode="numeric"
              value={quorum}
              onChange={(event) => {
                setQuorum(event.target.value);
              }}
            />
          )}
        </FormField>
      </section>
      {faults.length === 0 && <FailureLine error={move.error} />}
      <Button type="submit" loading={move.isPending}>
        Accept the case
      </Button>
    </form>
  );
}
