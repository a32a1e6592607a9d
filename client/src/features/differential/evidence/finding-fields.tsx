import { TextArea, TextField } from '@radix-ui/themes';
import type { Settings } from '@weighhouse/shared/contracts/cases';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { FindingKind } from '@weighhouse/shared/contracts/findings';
import { FormField } from '../../../components/form-field';
import { SelectBox } from '../../../components/select-box';
import type { FindingValues, ReliabilityWord } from './finding-values';

export interface FieldsProps {
  values: FindingValues;
  set: (more: Partial<FindingValues>) => void;
  faults: readonly FieldFault[];
}

export const kindWords: Record<FindingKind, string> = {
  history: 'History',
  symptom: 'Symptom',
  sign: 'Sign on examination',
  laboratory: 'Laboratory',
  imaging: 'Imaging',
  test: 'Other test',
};

/** What the finding is. */
export function FindingFields({ values, set, faults, groups }: FieldsProps & { groups: Settings['groups'] }) {
  return (
    <>
      <FormField
        label="Finding"
        path="title"
        faults={faults}
        hint="One thing that could be present or absent, such as “Ferritin above 9,000 µg/L”."
      >
        {(control) => (
          <TextField.Root
            {...control}
            maxLength={300}
            value={values.title}
            onChange={(event) => {
              set({ title: event.target.value });
            }}
          />
        )}
      </FormField>
      <FormField label="Detail" path="detail" faults={faults} optional>
        {(control) => (
          <TextArea
            {...control}
            rows={2}
            maxLength={2000}
            value={values.detail}
            onChange={(event) => {
              set({ detail: event.target.value });
            }}
          />
        )}
      </FormField>
      <FormField label="Where it comes from" path="kind" faults={faults}>
        {(control) => (
          <SelectBox
            {...control}
            value={values.kind}
            onChange={(event) => {
              set({ kind: event.target.value as FindingKind | '' });
            }}
          >
            <option value="">Choose</option>
            {Object.entries(kindWords).map(([kind, words]) => (
              <option key={kind} value={kind}>
                {words}
              </option>
            ))}
          </SelectBox>
        )}
      </FormField>
      <FormField label="How far the report can be trusted" path="reliability" faults={faults}>
        {(control) => (
          <SelectBox
            {...control}
            value={values.reliability}
            onChange={(event) => {
              set({ reliability: event.target.value as ReliabilityWord | '' });
            }}
          >
            <option value="">Choose</option>
            <option value="firm">Firm: counts in full</option>
            <option value="fair">Fair: 70 of 100</option>
            <option value="doubtful">Doubtful: 40 of 100</option>
          </SelectBox>
        )}
      </FormField>
      {groups.length > 0 && (
        <FormField
          label="Overlaps with"
          path="groupId"
          faults={faults}
          optional
          hint="Findings that one mechanism explains."
        >
          {(control) => (
            <SelectBox
              {...control}
              value={values.groupId}
              onChange={(event) => {
                set({ groupId: event.target.value });
              }}
            >
              <option value="">No group</option>
              {groups.map((group) => (
                <option key={group.id} value={group.id}>
                  {group.label}
                </option>
              ))}
            </SelectBox>
          )}
        </FormField>
      )}
    </>
  );
}
