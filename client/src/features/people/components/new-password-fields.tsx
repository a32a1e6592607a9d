import { TextField } from '@radix-ui/themes';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { FormField } from '../../../components/form-field';

interface Props {
  /** The path of the new password in the contract. */
  path: string;
  faults: readonly FieldFault[];
  value: string;
  again: string;
  onChange: (value: string, again: string) => void;
}

/** A new password, twice, because nobody sees what is typed. */
export function NewPasswordFields({ path, faults, value, again, onChange }: Props) {
  return (
    <>
      <FormField
        label="New password"
        path={path}
        faults={faults}
        hint="At least 12 characters. Several words in a row are easy to remember."
      >
        {(control) => (
          <TextField.Root
            {...control}
            size="3"
            type="password"
            autoComplete="new-password"
            value={value}
            onChange={(event) => {
              onChange(event.target.value, again);
            }}
          />
        )}
      </FormField>
      <FormField label="The same again" path="again" faults={faults}>
        {(control) => (
          <TextField.Root
            {...control}
            size="3"
            type="password"
            autoComplete="new-password"
            value={again}
            onChange={(event) => {
              onChange(value, event.target.value);
            }}
          />
        )}
      </FormField>
    </>
  );
}
