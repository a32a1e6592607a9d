import { Button, Dialog } from '@radix-ui/themes';

const keys: [string, string][] = [
  ['Arrow keys', 'move through the ledger'],
  ['Home, End', 'first and last column; with Ctrl, the corners'],
  ['Page up, Page down', 'eight rows at once'],
  ['Enter', 'opens the row'],
  ['0 to 9', 'begin typing the likelihood of the cell'],
  ['w', 'says how the number of the cell came about'],
  ['m', 'opens the menu of the column: pin, fold'],
  ['Esc', 'closes the side'],
  ['Up, Down in a field', 'go to the candidate above or below'],
  ['Enter in a field', 'saves the judgement'],
  ['?', 'shows these keys'],
];

export function KeysDialog({ open, onOpenChange }: { open: boolean; onOpenChange: (open: boolean) => void }) {
  return (
    <Dialog.Root open={open} onOpenChange={onOpenChange}>
      <Dialog.Content className="ledger-dialog" aria-describedby={undefined}>
        <Dialog.Title size="4">Keys in the ledger</Dialog.Title>
        <table className="keys-table">
          <tbody>
            {keys.map(([key, does]) => (
              <tr key={key}>
                <th scope="row">{key}</th>
                <td>{does}</td>
              </tr>
            ))}
          </tbody>
        </table>
        <div className="actions dialog-actions">
          <Dialog.Close>
            <Button variant="outline">Close</Button>
          </Dialog.Close>
        </div>
      </Dialog.Content>
    </Dialog.Root>
  );
}
