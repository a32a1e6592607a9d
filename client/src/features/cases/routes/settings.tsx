import '../components/team.css';
import { Button, TextArea, TextField } from '@radix-ui/themes';
import type { Case } from '@weighhouse/shared/contracts/cases';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { type SubmitEvent, useState } from 'react';
import { EmptyState } from '../../../components/empty-state';
import { ErrorSummary } from '../../../components/error-summary';
import { FailureLine } from '../../../components/failure';
import { FormField } from '../../../components/form-field';
import { isApiError } from '../../../lib/api';
import { useFormat } from '../../../lib/use-format';
import { useChangeSettings } from '../api/change-settings';
import { useCase, useCaseId } from '../api/get-case';
import { ConferenceField } from '../components/conference-field';
import { changedSettings, typedSettings } from '../components/settings-form';

const labels = { tempering: 'Tempering', quorum: 'Quorum', conferenceAt: 'Conference', reason: 'Why' };

/** How a case is weighed and when it is discussed; for its chair. */
export default function SettingsPage() {
  const { data } = useCase(useCaseId());
  if (!data) return null;
  return (
    <div className="page team-page">
      {data.abilities.includes('settings.change') ? (
        <SettingsForm of={data} />
      ) : (
        <EmptyState title="The settings are closed now.">
          The chair can change them while the case is accepted or judged.
        </EmptyState>
      )}
    </div>
  );
}

function SettingsForm({ of }: { of: Case }) {
  const format = useFormat();
  const save = useChangeSettings(of.id);
  const [typed, setTyped] = useState(() => typedSettings(of, format));
  const [faults, setFaults] = useState<FieldFault[]>([]);

  const submit = async (event: SubmitEvent) => {
    event.preventDefault();
    const { change, faults: found } = changedSettings(typed, of, format);
    if (found.length === 0 && Object.keys(change).length === 1)
      found.push({ path: '', message: 'Nothing is changed yet.' });
    setFaults(found);
    if (found.length > 0) return;
    try {
      await save.mutateAsync(change);
      setTyped({ ...typed, reason: '' });
    } catch (error) {
      if (isApiError(error)) setFaults(error.fields);
    }
  };

  return (
    <form onSubmit={(event) => void submit(event)} noValidate>
      <h2 className="form-title">Settings of this case</h2>
      <p className="soft prose">
        Every change stands in the trail. The last reason is shown to the team under “How it was pooled”.
      </p>
      <div className="team-rest">
        <ErrorSummary faults={faults} labels={labels} title="The settings were not saved" />
        <FormField
          label={labels.tempering}
          path="tempering"
          faults={faults}
          hint="How much of its full strength every finding counts, out of 100, because findings in one patient overlap more than anyone can list. 30 to 100; a new case has 60. Counted in full is always shown as one end of the range."
        >
          {(control) => (
            <TextField.Root
              {...control}
              className="quorum-field figures"
              inputMode="numeric"
              value={typed.tempering}
              onChange={(event) => {
                setTyped({ ...typed, tempering: event.target.value });
              }}
            />
          )}
        </FormField>
        <FormField
          label={labels.quorum}
          path="quorum"
          faults={faults}
          hint="How many must have handed in before a sealed round can be unsealed."
        >
          {(control) => (
            <TextField.Root
              {...control}
              className="quorum-field figures"
              inputMode="numeric"
              value={typed.quorum}
              onChange={(event) => {
                setTyped({ ...typed, quorum: event.target.value });
              }}
            />
          )}
        </FormField>
        <ConferenceField
          value={typed.conference}
          faults={faults}
          timeZone={format.timeZone}
          onChange={(conference) => {
            setTyped({ ...typed, conference });
          }}
        />
        <FormField label={labels.reason} path="reason" faults={faults}>
          {(control) => (
            <TextArea
              {...control}
              rows={2}
              value={typed.reason}
              onChange={(event) => {
                setTyped({ ...typed, reason: event.target.value });
              }}
            />
          )}
        </FormField>
      </div>
      {faults.length === 0 && <FailureLine error={save.error} />}
      <div className="actions">
        <Button type="submit" loading={save.isPending}>
          Save the settings
        </Button>
        <span role="status">{save.isSuccess && typed.reason === '' ? 'The settings are saved.' : ''}</span>
      </div>
    </form>
  );
}
