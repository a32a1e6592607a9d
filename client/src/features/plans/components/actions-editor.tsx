import { Button } from '@radix-ui/themes';
import type { PersonRef } from '@weighhouse/shared/contracts/common';
import { useState } from 'react';
import { fieldId, faultOf } from '../../../components/faults';
import { type ActionDraft, emptyAction, moved, type PlanDraft, sentPlace } from '../model/plan-draft';
import { ActionFields } from './action-fields';
import type { FieldsProps } from './plan-fields';

interface Props extends FieldsProps {
  people: readonly PersonRef[];
}

interface Removed {
  action: ActionDraft;
  place: number;
}

/** The list of actions: add, remove with undo, and change the order, all by buttons. */
export function ActionsEditor({ draft, faults, onChange, people }: Props) {
  const [removed, setRemoved] = useState<Removed | null>(null);
  const [said, setSaid] = useState('');
  const { actions } = draft;
  const put = (next: PlanDraft['actions']) => {
    onChange({ ...draft, actions: next });
  };

  const add = () => {
    const key = crypto.randomUUID();
    put([...actions, emptyAction(key)]);
    setRemoved(null);
    focusSoon(`action-${key}`);
  };
  const move = (place: number, by: -1 | 1) => {
    const action = actions[place];
    if (!action) return;
    put(moved(actions, place, by));
    setSaid(
      `Action ${String(place + 1)} is now number ${String(place + by + 1)} of ${String(actions.length)}.`,
    );
    const atEnd = place + by === 0 || place + by === actions.length - 1;
    const same = by === -1 ? 'up' : 'down';
    focusSoon(`${action.key}-${atEnd ? (same === 'up' ? 'down' : 'up') : same}`);
  };
  const remove = (place: number) => {
    const action = actions[place];
    if (!action) return;
    put(actions.filter((_, other) => other !== place));
    setRemoved({ action, place });
    setSaid('');
    focusSoon('undo-remove');
  };
  const undo = () => {
    if (!removed) return;
    put(actions.toSpliced(removed.place, 0, removed.action));
    setRemoved(null);
    focusSoon(`action-${removed.action.key}`);
  };

  const fault = faultOf(
    faults.filter((one) => one.path === 'actions'),
    'actions',
  );
  return (
    <fieldset className="plan-actions" id={fieldId('actions')} tabIndex={-1}>
      <legend>Actions</legend>
      <p className="field-hint">Each says what, who does it and by when. Its owner reports it done.</p>
      {fault && <p className="field-fault">{fault}</p>}
      {actions.length === 0 && (
        <p className="soft plan-empty">No action yet. Add the first: what is done next, and by whom?</p>
      )}
      <ol>
        {actions.map((action, place) => (
          <ActionFields
            key={action.key}
            action={action}
            place={place}
            last={actions.length - 1}
            path={pathOf(actions, action.key)}
            faults={faults}
            people={people}
            onChange={(next) => {
              put(actions.map((one) => (one.key === action.key ? next : one)));
            }}
            onMove={(by) => {
              move(place, by);
            }}
            onRemove={() => {
              remove(place);
            }}
          />
        ))}
      </ol>
      <div className="actions">
        <Button type="button" variant="outline" onClick={add} disabled={actions.length >= 60}>
          Add an action
        </Button>
        {removed && (
          <span role="status">
            <span className="soft">
              Removed{removed.action.what === '' ? '' : ` “${shortened(removed.action.what)}”`}.{' '}
            </span>
            <Button type="button" variant="ghost" id="undo-remove" onClick={undo}>
              Undo
            </Button>
          </span>
        )}
      </div>
      <p className="aside-text" role="status">
        {said}
      </p>
    </fieldset>
  );
}

/** The path by which the server names this action; one that it does not have yet gets none of its faults. */
function pathOf(actions: readonly ActionDraft[], key: string): string {
  const place = sentPlace(actions, key);
  return place === null ? `unsent.${key}` : `actions[${String(place)}]`;
}

const shortened = (text: string) => (text.length > 40 ? `${text.slice(0, 38)}…` : text);

/** After the change is on the page: the control itself, or the first one of a row. */
function focusSoon(id: string): void {
  requestAnimationFrame(() => {
    const target = document.getElementById(id);
    (target?.querySelector('textarea') ?? target)?.focus();
  });
}
