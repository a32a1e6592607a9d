import { TextArea } from '@radix-ui/themes';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { certainties } from '@weighhouse/shared/contracts/plans';
import { FieldGroup, FormField } from '../../../components/form-field';
import { SelectBox } from '../../../components/select-box';
import { certaintyWords } from '../model/certainty-words';
import type { PlanDraft } from '../model/plan-draft';

export interface FieldsProps {
  draft: PlanDraft;
  faults: readonly FieldFault[];
  onChange: (draft: PlanDraft) => void;
}

/** The candidates that the plan can name. */
export interface Choice {
  id: string;
  name: string;
}

/** Working diagnosis and how certain it is. */
export function DiagnosisFields({
  draft,
  faults,
  onChange,
  candidates,
}: FieldsProps & { candidates: readonly Choice[] }) {
  const known = candidates.some((one) => one.id === draft.candidateId);
  return (
    <>
      <FormField
        label="Working diagnosis"
        path="workingDiagnosis"
        faults={faults}
        hint="In one or two sentences, as it will be signed."
      >
        {(control) => (
          <TextArea
            {...control}
            rows={2}
            maxLength={500}
            resize="vertical"
            value={draft.workingDiagnosis}
            onChange={(event) => {
              onChange({ ...draft, workingDiagnosis: event.target.value });
            }}
          />
        )}
      </FormField>
      <FormField label="The candidate it stands for" path="candidateId" faults={faults} optional>
        {(control) => (
          <SelectBox
            {...control}
            value={draft.candidateId ?? ''}
            onChange={(event) => {
              onChange({ ...draft, candidateId: event.target.value === '' ? null : event.target.value });
            }}
          >
            <option value="">No single candidate</option>
            {candidates.map((one) => (
              <option key={one.id} value={one.id}>
                {one.name}
              </option>
            ))}
            {draft.candidateId !== null && !known && (
              <option value={draft.candidateId}>The candidate chosen before</option>
            )}
          </SelectBox>
        )}
      </FormField>
      <FieldGroup label="How certain it is" path="certainty" faults={faults}>
        {certainties.map((certainty) => (
          <label key={certainty} className="plan-choice">
            <input
              type="radio"
              name="certainty"
              checked={draft.certainty === certainty}
              onChange={() => {
                onChange({ ...draft, certainty });
              }}
            />
            <span>
              {certaintyWords[certainty].name}
              <span className="soft small">{certaintyWords[certainty].meaning}</span>
            </span>
          </label>
        ))}
      </FieldGroup>
    </>
  );
}

const long = {
  remainingDoubt: {
    label: 'Remaining doubt',
    hint: 'What else it could be, what would change the plan, and what the panel did not agree on.',
  },
  safetyNet: {
    label: 'Safety-net advice',
    hint: 'What the patient watches for, how soon to act on it and whom to call. The patient is told this.',
  },
} as const;

export function LongField({ draft, faults, onChange, name }: FieldsProps & { name: keyof typeof long }) {
  return (
    <FormField label={long[name].label} path={name} faults={faults} hint={long[name].hint}>
      {(control) => (
        <TextArea
          {...control}
          rows={4}
          maxLength={4000}
          resize="vertical"
          value={draft[name]}
          onChange={(event) => {
            onChange({ ...draft, [name]: event.target.value });
          }}
        />
      )}
    </FormField>
  );
}
