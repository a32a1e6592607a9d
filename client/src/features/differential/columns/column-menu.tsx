import { DropdownMenu } from '@radix-ui/themes';
import type { ReactNode } from 'react';
import { useLedger } from '../ledger/ledger-context';
import { counted } from '../../../lib/words';
import { fold, foldAll, pin, plainChoice, smallColumns, unfold, unpin } from './column-choice';
import { useColumnChoice } from './column-choice-context';
import type { ShownColumn } from './arrange';

interface Props {
  of: ShownColumn;
  open: boolean;
  onOpenChange: (open: boolean) => void;
  /** The button that opens it. */
  children: ReactNode;
}

/** What can be done with one column: stay at the left, or become a narrow strip. */
export function ColumnMenu({ of, open, onOpenChange, children }: Props) {
  return (
    <DropdownMenu.Root open={open} onOpenChange={onOpenChange}>
      <DropdownMenu.Trigger>{children}</DropdownMenu.Trigger>
      <DropdownMenu.Content variant="soft" highContrast>
        <Items of={of} />
      </DropdownMenu.Content>
    </DropdownMenu.Root>
  );
}

function Items({ of: { column, folded, pinned } }: { of: ShownColumn }) {
  const { columns, differential } = useLedger();
  const { choice, choose } = useColumnChoice();
  const small = smallColumns(columns, differential.assessment?.standing ?? null, choice);
  const laidOut = choice.pinned.length + choice.folded.length > 0;
  return (
    <>
      <DropdownMenu.Label>{column.short}</DropdownMenu.Label>
      {!column.none && (
        <>
          <DropdownMenu.Item
            onSelect={() => {
              choose((known) => (pinned ? unpin(known, column.id) : pin(known, column.id)));
            }}
          >
            {pinned ? 'Unpin' : 'Pin at the left'}
          </DropdownMenu.Item>
          <DropdownMenu.Item
            onSelect={() => {
              choose((known) => (folded ? unfold(known, column.id) : fold(known, column.id)));
            }}
          >
            {folded ? 'Unfold' : 'Fold to a narrow strip'}
          </DropdownMenu.Item>
          <DropdownMenu.Separator />
        </>
      )}
      {column.none && <DropdownMenu.Item disabled>Always stays at the right</DropdownMenu.Item>}
      {small.length > 0 && (
        <DropdownMenu.Item
          onSelect={() => {
            choose((known) => foldAll(known, small));
          }}
        >
          {`Fold ${counted(small.length, 'column')} below 2 of 100`}
        </DropdownMenu.Item>
      )}
      <DropdownMenu.Item
        disabled={!laidOut}
        onSelect={() => {
          choose(() => plainChoice);
        }}
      >
        All columns as they were
      </DropdownMenu.Item>
    </>
  );
}
