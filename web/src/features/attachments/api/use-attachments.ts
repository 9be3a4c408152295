import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { Attachments, Licence } from '../../../shared/api/types';

const ATTACHMENTS = '/api/correlations/{slug}/revisions/{number}/attachments';

export interface NewDocument {
  file: File;
  /** Index of the source it is of. */
  source: number;
  licence: Licence;
}

/** Documents attached to the sources of one revision, and what can be done with them. */
export function useAttachments(slug: string, number: number) {
  const path = { slug, number };
  const { data, error, mutate } = useSWR<Attachments, ApiProblem>([ATTACHMENTS, slug, number], () =>
    ask(api.GET(ATTACHMENTS, { params: { path } })),
  );
  const add = async ({ file, source, licence }: NewDocument) => {
    await ask(
      api.POST(ATTACHMENTS, {
        params: { path },
        body: { file, source: String(source), licence },
        bodySerializer: (body) => {
          const form = new FormData();
          form.set('source', body.source);
          form.set('licence', body.licence);
          form.set('file', file, file.name);
          return form;
        },
      }),
    );
    await mutate();
  };
  const setLicence = async (id: string, licence: Licence) => {
    await ask(
      api.POST(`${ATTACHMENTS}/{id}/licence`, { params: { path: { ...path, id } }, body: { licence } }),
    );
    await mutate();
  };
  return { attachments: data, problem: error, retry: () => void mutate(), add, setLicence };
}

/** Where a document is saved from. */
export function fileAddress(slug: string, number: number, id: string): string {
  return `/api/correlations/${encodeURIComponent(slug)}/revisions/${number}/attachments/${id}/file`;
}
