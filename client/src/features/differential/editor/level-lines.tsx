import type { Finding } from '@weighhouse/shared/contracts/findings';
import { type Column, columnLabel } from '../model/columns';
import { levelName } from '../model/finding-words';
import { readShares, restWords } from '../typing/sum';
import { askedName } from './likelihood-line';
import { NumberField } from './number-field';

interface Props {
  finding: Finding;
  column: Column;
  texts: readonly string[];
  onChange: (level: number, text: string) => void;
  fault: string | null;
}

/** The same question for a finding with more than two levels: a share for each, together 100. */
export function LevelLines({ finding, column, texts, onChange, fault }: Props) {
  const shares = readShares(texts);
  const begun = texts.some((text) => text.trim() !== '');
  const sumId = `sum-${column.id}`;
  return (
    <fieldset className="level-lines">
      <legend>If it were {column.none ? 'none of these' : columnLabel(column)}</legend>
      {texts.map((text, level) => (
        <div key={level} className="level-line">
          <span aria-hidden="true">{levelName(finding, level)}</span>
          <NumberField
            label={`If it were ${askedName(column)}, how many of 100 would have “${levelName(finding, level)}”?`}
            value={text}
            onChange={(next) => {
              onChange(level, next);
            }}
            fault={shares.faults.some((one) => one.index === level)}
            describedBy={sumId}
            place={level === 0 ? column.id : `${column.id}.${String(level)}`}
          />
        </div>
      ))}
      <p id={sumId} className={fault === null ? 'soft small' : 'field-fault'}>
        {fault ?? (begun ? restWords(shares) : 'All levels, or leave it blank')}
      </p>
    </fieldset>
  );
}
