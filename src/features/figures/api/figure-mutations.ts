import { useMutation, useQueryClient, type QueryClient } from '@tanstack/react-query';
import { figuresEndpoints, type FigureDetail, type FigureInput } from '#shared/contracts/figures.js';
import { callApi } from '#src/lib/api-client.js';
import { sessionQuery } from '#src/lib/session.js';
import { chartQuery, figureQuery } from './figures-queries.js';

/** A new figure, or a new state of one. */
export function useSaveFigure(communityId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({
      input,
      saved,
    }: {
      input: FigureInput;
      /** The state that it was written over; null for a new figure. */
      saved: { figureId: string; version: number } | null;
    }) =>
      saved === null
        ? callApi(figuresEndpoints.create, { params: { communityId }, body: input })
        : callApi(figuresEndpoints.update, {
            params: { communityId, figureId: saved.figureId },
            body: { ...input, version: saved.version },
          }),
    onSuccess: (figure) => {
      takeFigure(client, figure);
    },
  });
}

export function useTakeOutFigure(communityId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (figureId: string) => callApi(figuresEndpoints.remove, { params: { communityId, figureId } }),
    onSuccess: () => {
      lookAgain(client);
    },
  });
}

export function usePutBackFigure(communityId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (figureId: string) =>
      callApi(figuresEndpoints.restore, { params: { communityId, figureId } }),
    onSuccess: (figure) => {
      takeFigure(client, figure);
    },
  });
}

function takeFigure(client: QueryClient, figure: FigureDetail): void {
  client.setQueryData(figureQuery(figure.communityId, figure.id).queryKey, figure);
  lookAgain(client);
}

/** A figure stands in tables of stars, drafts and Today. Who is signed in and where stars stand stay as they are. */
function lookAgain(client: QueryClient): void {
  const kept = [sessionQuery.queryKey[0], chartQuery().queryKey[0]];
  void client.invalidateQueries({ predicate: (query) => !kept.includes(String(query.queryKey[0])) });
}
