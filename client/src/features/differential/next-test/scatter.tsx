import { useId, useState } from 'react';
import { useWidth } from '../ledger/use-width';
import { ScatterDrawing } from './scatter-drawing';
import type { TestView } from './tests-view';
import './scatter.css';

export type Takes = 'waitDays' | 'cost';

const choices: { value: Takes; label: string; axis: string }[] = [
  { value: 'waitDays', label: 'Wait', axis: 'days until the result' },
  { value: 'cost', label: 'Cost', axis: 'cost' },
];

/** What each test settles against how long it takes or what it costs. The table below the list says the same. */
export function Scatter({ tests }: { tests: readonly TestView[] }) {
  const [takes, setTakes] = useState<Takes>('waitDays');
  const [box, width] = useWidth<HTMLDivElement>();
  const id = useId();
  const axis = choices.find((choice) => choice.value === takes)?.axis ?? '';
  return (
    <div className="scatter">
      <fieldset className="exposure">
        <legend>What a test settles, against its wait or its cost</legend>
        <div className="exposure-choices no-print">
          {choices.map((choice) => (
            <label key={choice.value} data-chosen={takes === choice.value || undefined}>
              <input
                type="radio"
                name={id}
                checked={takes === choice.value}
                onChange={() => {
                  setTakes(choice.value);
                }}
              />
              {choice.label}
            </label>
          ))}
        </div>
      </fieldset>
      <div ref={box}>
        {width > 0 && <ScatterDrawing tests={tests} takes={takes} axis={axis} width={width} />}
      </div>
      <ul className="scatter-key small soft">
        <li>
          <svg width="14" height="14" aria-hidden="true">
            <circle className="scatter-dot" data-best cx="7" cy="7" r="5" />
          </svg>
          best for what it takes in all: cost, wait and burden
        </li>
        <li>
          <svg width="14" height="14" aria-hidden="true">
            <circle className="scatter-dot" cx="7" cy="7" r="5" />
          </svg>
          another settles as much for less
        </li>
        <li>
          <svg width="22" height="14" aria-hidden="true">
            <path className="scatter-stair" d="M1 12H11V3H21" />
          </svg>
          the most that one test settles within {takes === 'cost' ? 'that cost' : 'that wait'}
        </li>
      </ul>
    </div>
  );
}
