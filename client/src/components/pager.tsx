import { Button } from '@radix-ui/themes';

interface Props {
  page: number;
  size: number;
  total: number;
  onPage: (page: number) => void;
}

/** "1 to 25 of 61", with the way to the next and the previous page; nothing where one page is all. */
export function Pager({ page, size, total, onPage }: Props) {
  if (total <= size && page === 1) return null;
  const first = Math.min(total, (page - 1) * size + 1);
  const last = Math.min(total, page * size);
  const step = (to: number, label: string, possible: boolean) => (
    <Button
      variant="outline"
      color="gray"
      highContrast
      disabled={!possible}
      onClick={() => {
        onPage(to);
      }}
    >
      {label}
    </Button>
  );
  return (
    <nav className="pager" aria-label="Pages">
      {step(page - 1, 'Previous', page > 1)}
      <span className="soft" role="status">
        {first} to {last} of {total}
      </span>
      {step(page + 1, 'Next', last < total)}
    </nav>
  );
}
