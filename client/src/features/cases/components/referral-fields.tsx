import { RadioGroup, TextArea, TextField } from '@radix-ui/themes';
import { type Sex, sexSchema, type Urgency, urgencySchema } from '@weighhouse/shared/contracts/cases';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { FieldGroup, FormField } from '../../../components/form-field';
import { RichText } from '../../../components/rich-text';
import { SelectBox } from '../../../components/select-box';
import { useFormat } from '../../../lib/use-format';
import { capital } from '../../../lib/words';
import { sexWords, urgencyWords } from './case-words';
import { type DraftForm, draftLabels } from './draft-form';

interface Props {
  form: DraftForm;
  faults: readonly FieldFault[];
  onChange: (part: Partial<DraftForm>) => void;
}

export function QuestionField({ form, faults, onChange }: Props) {
  return (
    <FormField
      label={draftLabels.question}
      path="question"
      faults={faults}
      hint="One sentence that the panel can answer, with what stands out: how long, which signs, which result. No name, no date of birth."
    >
      {(control) => (
        <TextArea
          {...control}
          rows={3}
          maxLength={300}
          value={form.question}
          onChange={(event) => {
            onChange({ question: event.target.value });
          }}
        />
      )}
    </FormField>
  );
}

export function PatientFields({ form, faults, onChange }: Props) {
  return (
    <div className="field-row">
      <FormField label={draftLabels.age} path="age" faults={faults} hint="In whole years">
        {(control) => (
          <TextField.Root
            {...control}
            inputMode="numeric"
            maxLength={3}
            value={form.age}
            onChange={(event) => {
              onChange({ age: event.target.value });
            }}
          />
        )}
      </FormField>
      <FormField label={draftLabels.sex} path="sex" faults={faults} hint="As recorded">
        {(control) => (
          <SelectBox
            {...control}
            value={form.sex}
            onChange={(event) => {
              onChange({ sex: event.target.value as Sex | '' });
            }}
          >
            <option value="">Choose</option>
            {sexSchema.options.map((sex) => (
              <option key={sex} value={sex}>
                {capital(sexWords[sex])}
              </option>
            ))}
          </SelectBox>
        )}
      </FormField>
    </div>
  );
}

export function UrgencyFields({ form, faults, onChange }: Props) {
  return (
    <>
      <FieldGroup label="How soon is an answer needed?" path="urgency" faults={faults}>
        <RadioGroup.Root
          aria-label="How soon is an answer needed?"
          value={form.urgency}
          onValueChange={(value) => {
            onChange({ urgency: value as Urgency });
          }}
        >
          {urgencySchema.options.map((urgency) => (
            <RadioGroup.Item key={urgency} value={urgency}>
              {capital(urgencyWords[urgency])}
            </RadioGroup.Item>
          ))}
        </RadioGroup.Root>
      </FieldGroup>
      <FormField
        label={draftLabels.urgencyReason}
        path="urgencyReason"
        faults={faults}
        optional={form.urgency === 'noFixedTime'}
      >
        {(control) => (
          <TextArea
            {...control}
            rows={2}
            maxLength={1000}
            value={form.urgencyReason}
            onChange={(event) => {
              onChange({ urgencyReason: event.target.value });
            }}
          />
        )}
      </FormField>
    </>
  );
}

export function ConsentFields({ form, faults, onChange }: Props) {
  const today = useFormat().today();
  return (
    <>
      <FieldGroup
        label="Has the patient, or who decides for them, agreed that this panel reads and discusses the case?"
        path="consent"
        faults={faults}
      >
        <RadioGroup.Root
          aria-label="Consent"
          value={form.consentHow === '' ? 'none' : form.consentHow}
          onValueChange={(value) => {
            onChange(
              value === 'none'
                ? { consentHow: '', consentOn: '' }
                : { consentHow: value as 'signed' | 'spoken' },
            );
          }}
        >
          <RadioGroup.Item value="none">Not yet</RadioGroup.Item>
          <RadioGroup.Item value="signed">Yes, signed</RadioGroup.Item>
          <RadioGroup.Item value="spoken">Yes, spoken</RadioGroup.Item>
        </RadioGroup.Root>
      </FieldGroup>
      {form.consentHow !== '' && (
        <FormField label="Given on" path="consent.givenOn" faults={faults}>
          {(control) => (
            <TextField.Root
              {...control}
              className="short-field"
              type="date"
              max={today}
              value={form.consentOn}
              onChange={(event) => {
                onChange({ consentOn: event.target.value });
              }}
            />
          )}
        </FormField>
      )}
    </>
  );
}

export function HistoryField({ form, faults, onChange, fills }: Props & { fills: number }) {
  return (
    <FormField
      label={draftLabels.historyHtml}
      path="historyHtml"
      faults={faults}
      hint="In order of time: how it began, what was seen and when, examination, results with unit and reference interval, medicines, allergies, what was tried. No name, no date of birth."
    >
      {(control) => (
        <RichText
          id={control.id}
          label="History"
          describedBy={control['aria-describedby']}
          html={form.historyHtml}
          resetKey={fills}
          onChange={(historyHtml) => {
            onChange({ historyHtml });
          }}
        />
      )}
    </FormField>
  );
}
