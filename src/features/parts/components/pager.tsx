import { Button } from '@/components/ui/button';

interface Props {
  page: number;
  perPage: number;
  total: number;
  onPage: (page: number) => void;
}

/** `1–100 of 240`, and the way on and back. */
export function Pager({ page, perPage, total, onPage }: Props) {
  const first = (page - 1) * perPage + 1;
  const last = Math.min(total, page * perPage);
  return (
    <nav aria-label="pages of the list" className="flex items-center gap-4">
      <span aria-live="polite" className="text-stone">
        {first}–{last} of {total}
      </span>
      {total > perPage && (
        <>
          <Button disabled={page <= 1} onClick={() => onPage(page - 1)}>
            Before
          </Button>
          <Button disabled={last >= total} onClick={() => onPage(page + 1)}>
            Next
          </Button>
        </>
      )}
    </nav>
  );
}
