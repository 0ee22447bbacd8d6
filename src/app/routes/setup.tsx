import type { BoardDetail } from '@shared/schemas/board.schema';
import type { Rail } from '@shared/schemas/rail.schema';
import { useQueryClient } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Failure } from '@/components/ui/failure';
import { Loading } from '@/components/ui/page';
import { boardQuery, useBoard } from '@/features/boards/api/boards';
import { useRails } from '@/features/rails/api/rails';
import { SetupPage } from '@/features/setup/components/setup-page';
import { pairKey, type SetupUsage } from '@/features/setup/lib/setup-usage';

export function Component() {
  const { boardId = '' } = useParams();
  const client = useQueryClient();
  const board = useBoard(boardId);
  const rails = useRails(boardId);
  if (board.isError && !board.data)
    return <Failure error={board.error} what="the board" retry={() => void board.refetch()} />;
  if (!board.data) return <Loading what="the stack-up" />;
  /** The server has computed every rail anew. */
  const takeSaved = (saved: BoardDetail) => {
    client.setQueryData(boardQuery(boardId).queryKey, saved);
    void client.invalidateQueries({ queryKey: ['boards'] });
  };
  return (
    <SetupPage
      key={boardId}
      board={board.data}
      usage={usageOf(rails.data?.rails ?? [])}
      onSaved={takeSaved}
    />
  );
}

/** Which rails stand on which recipe and which plane pair. */
function usageOf(rails: readonly Rail[]): SetupUsage {
  const recipes = new Map<string, string[]>();
  const pairs = new Map<string, string[]>();
  const note = (map: Map<string, string[]>, key: string, name: string) => {
    const names = map.get(key) ?? [];
    if (!names.includes(name)) map.set(key, [...names, name]);
  };
  for (const { spec, bank } of rails) {
    const pair = spec.plane?.geometry?.pair;
    if (pair) note(pairs, pairKey(...pair), spec.name);
    for (const line of bank) if (line.recipeId !== null) note(recipes, line.recipeId, spec.name);
  }
  return { recipes, pairs };
}
