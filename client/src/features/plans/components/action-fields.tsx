import { Button, TextArea, TextField } from '@radix-ui/themes';
import type { PersonRef } from '@weighhouse/shared/contracts/common';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { FormField } from '../../../components/form-field';
import { SelectBox } from '../../../components/select-box';
import { type ActionDraft, isSent } from '../model/plan-draft';

interface Props {
  action: ActionDraft;
  /** From 0. */
  place: number;
  last: number;
  /** Where the server's faults name it, such as actions[2]. */
  path: string;
  faults: readonly FieldFault[];
  people: readonly PersonRef[];
  onChange: (action: ActionDraft) => void;
  onMove: (by: -1 | 1) => void;
  onRemove: () => void;
}

/** One action being written. */
export function ActionFields({
  action,
  place,
  last,
  path,
  faults,
  people,
  onChange,
  onMove,
  onRemove,
}: Props) {
  const name = `action ${String(place + 1)}`;
  const begun = action.ownerId !== null || action.due !== null || action.concernsPatient;
  return (
    <li className="plan-action" id={`action-${action.key}`}>
      <FormField
        label={`${String(place + 1)}. What is to be done`}
        path={`${path}.what`}
        faults={faults}
        {...(begun && !isSent(action) ? { hint: 'Not saved yet: say what is to be done.' } : {})}
      >
        {(control) => (
          <TextArea
            {...control}
            rows={2}
            maxLength={500}
            resize="vertical"
            value={action.what}
            onChange={(event) => {
              onChange({ ...action, what: event.target.value });
            }}
          />
        )}
      </FormField>
      <div className="plan-action-line">
        <FormField label="Who" path={`${path}.ownerId`} faults={faults}>
          {(control) => (
            <SelectBox
              {...control}
              value={action.ownerId ?? ''}
              onChange={(event) => {
                onChange({ ...action, ownerId: event.target.value === '' ? null : event.target.value });
              }}
            >
              <option value="">Nobody yet</option>
              {people.map((person) => (
                <option key={person.id} value={person.id}>
                  {person.specialty === '' ? person.name : `${person.name}, ${person.specialty}`}
                </option>
              ))}
            </SelectBox>
          )}
        </FormField>
        <FormField label="By when" path={`${path}.due`} faults={faults}>
          {(control) => (
            <TextField.Root
              {...control}
              type="date"
              value={action.due ?? ''}
              onChange={(event) => {
                onChange({ ...action, due: event.target.value === '' ? null : event.target.value });
              }}
            />
          )}
        </FormField>
        <label className="plan-choice">
          <input
            type="checkbox"
            checked={action.concernsPatient}
            onChange={(event) => {
              onChange({ ...action, concernsPatient: event.target.checked });
            }}
          />
          <span>The patient is told of it</span>
        </label>
        <div className="plan-action-moves">
          <Button
            type="button"
            variant="ghost"
            id={`${action.key}-up`}
            disabled={place === 0}
            onClick={() => {
              onMove(-1);
            }}
          >
            Move up<span className="aside-text"> {name}</span>
          </Button>
          <Button
            type="button"
            variant="ghost"
            id={`${action.key}-down`}
            disabled={place === last}
            onClick={() => {
              onMove(1);
            }}
          >
            Move down<span className="aside-text"> {name}</span>
          </Button>
          <Button type="button" variant="ghost" color="red" onClick={onRemove}>
            Remove<span className="aside-text"> {name}</span>
          </Button>
        </div>
      </div>
    </li>
  );
}
