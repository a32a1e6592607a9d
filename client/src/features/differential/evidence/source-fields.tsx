import { TextField } from '@radix-ui/themes';
import { FormField } from '../../../components/form-field';
import { SelectBox } from '../../../components/select-box';
import { useReportsOf } from '../../findings/api/list-reports';
import type { FieldsProps } from './finding-fields';

/** Where it is written and when it was so. */
export function SourceFields({ caseId, values, set, faults }: FieldsProps & { caseId: string }) {
  const reports = useReportsOf(caseId).data?.items ?? [];
  return (
    <>
      <FormField label="Date" path="observedOn" faults={faults} optional>
        {(control) => (
          <TextField.Root
            {...control}
            type="date"
            value={values.observedOn}
            onChange={(event) => {
              set({ observedOn: event.target.value });
            }}
          />
        )}
      </FormField>
      {reports.length > 0 && (
        <FormField label="Report" path="source.reportId" faults={faults} optional>
          {(control) => (
            <SelectBox
              {...control}
              value={values.reportId}
              onChange={(event) => {
                set({ reportId: event.target.value });
              }}
            >
              <option value="">No report</option>
              {reports.map((report) => (
                <option key={report.id} value={report.id}>
                  {report.fileName}
                </option>
              ))}
            </SelectBox>
          )}
        </FormField>
      )}
      {values.reportId !== '' && (
        <FormField label="Page" path="source.page" faults={faults} optional>
          {(control) => (
            <TextField.Root
              {...control}
              inputMode="numeric"
              maxLength={5}
              value={values.page}
              onChange={(event) => {
                set({ page: event.target.value });
              }}
            />
          )}
        </FormField>
      )}
      <FormField
        label="Source in words"
        path="source.text"
        faults={faults}
        optional
        hint="Who saw it, or where it is written."
      >
        {(control) => (
          <TextField.Root
            {...control}
            maxLength={300}
            value={values.sourceText}
            onChange={(event) => {
              set({ sourceText: event.target.value });
            }}
          />
        )}
      </FormField>
    </>
  );
}
