import { Button, TextField } from '@radix-ui/themes';
import { type CaseQuery, caseStates } from '@weighhouse/shared/contracts/cases';
import { useEffect, useState } from 'react';
import { SelectBox } from '../../../components/select-box';
import { stateWords } from './case-words';

interface Props {
  query: CaseQuery;
  onChange: (change: Partial<Record<'state' | 'q', string>>) => void;
}

/** Search and state. What is typed is searched for after a short pause, or at once with Enter. */
export function CaseFilter({ query, onChange }: Props) {
  const [typed, setTyped] = useState(query.q ?? '');
  const asked = query.q ?? '';
  const [seen, setSeen] = useState({ asked, sent: asked });
  const ask = (q: string) => {
    setSeen((before) => ({ ...before, sent: q }));
    onChange({ q });
  };
  // The address changed: unless it was this field, it takes over what is asked now.
  if (seen.asked !== asked) {
    setSeen({ ...seen, asked });
    if (seen.sent !== asked) setTyped(asked);
  }
  useEffect(() => {
    if (typed.trim() === asked) return;
    const timer = setTimeout(() => {
      setSeen((before) => ({ ...before, sent: typed.trim() }));
      onChange({ q: typed.trim() });
    }, 350);
    return () => {
      clearTimeout(timer);
    };
  }, [typed, asked, onChange]);
  const narrowed = asked !== '' || query.state !== undefined;
  return (
    <form
      className="case-filter"
      role="search"
      onSubmit={(event) => {
        event.preventDefault();
        ask(typed.trim());
      }}
    >
      <TextField.Root
        aria-label="Search by number or words of the question"
        placeholder="Number or words of the question"
        type="search"
        maxLength={100}
        value={typed}
        onChange={(event) => {
          setTyped(event.target.value);
        }}
      />
      <SelectBox
        aria-label="State"
        value={query.state ?? ''}
        onChange={(event) => {
          onChange({ state: event.target.value });
        }}
      >
        <option value="">Every state</option>
        <option value="open">Open</option>
        <option value="closed">Closed</option>
        {caseStates.map((state) => (
          <option key={state} value={state}>
            {stateWords[state]}
          </option>
        ))}
      </SelectBox>
      {narrowed && (
        <Button
          type="button"
          variant="ghost"
          color="gray"
          highContrast
          onClick={() => {
            setTyped('');
            onChange({ q: '', state: '' });
          }}
        >
          Show all
        </Button>
      )}
    </form>
  );
}
