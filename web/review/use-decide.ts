import { useMutation, useQueryClient } from '@tanstack/react-query';
import { toast } from 'sonner';
import { revisionKey } from '#web/revision/revision-queries.ts';
import { announce } from '#web/ui/announce.ts';

/** A change of state: done once, then everything of the revision is asked for again. */
export function useDecide<Given>(revisionId: string, done: string, decide: (given: Given) => Promise<unknown>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: decide,
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: revisionKey(revisionId) });
      void client.invalidateQueries({ queryKey: ['assemblies'] });
      toast.success(done);
      announce(done);
    },
  });
}
