import { useQueryClient } from '@tanstack/react-query';
import { BOARDS_KEY, UNITS_KEY } from '@windrow/client/board/board-queries';

/** After a bed was added, opened or closed: the plan is below the units, and boards show it too. */
export function useBedsChanged(): () => Promise<void> {
  const queryClient = useQueryClient();
  return async () => {
    await Promise.all([
      queryClient.invalidateQueries({ queryKey: UNITS_KEY }),
      queryClient.invalidateQueries({ queryKey: BOARDS_KEY }),
      queryClient.invalidateQueries({ queryKey: ['capacity'] }),
    ]);
  };
}
