import { http, HttpResponse } from 'msw';
import { setupServer } from 'msw/node';
import type { Compared } from '@/components/forms/release/comparison-query';
import { NOW } from '@/tests/support/database';

/** Our own handlers as the form meets them; every other request fails the test. */
export function deskServer() {
  const saved: unknown[] = [];
  const asked: unknown[] = [];
  type Draft = { body: unknown; savedAt: number } | null;
  /** `elsewhere` is what another tab keeps once the form is open. */
  const kept: { draft: Draft; elsewhere: Draft; compared: Compared } = {
    draft: null,
    elsewhere: null,
    compared: { previous: null, comparison: null },
  };
  const server = setupServer(
    http.get('*/api/desk/drafts', () => HttpResponse.json(kept.draft)),
    http.put('*/api/desk/drafts', async ({ request }) => {
      const { body, basedOn } = (await request.json()) as { body: string; basedOn: number | null };
      if (kept.elsewhere && basedOn !== kept.elsewhere.savedAt) {
        kept.draft = kept.elsewhere;
        return refuse(409, 'This draft was changed in another tab.');
      }
      saved.push(JSON.parse(body));
      return HttpResponse.json({ savedAt: NOW });
    }),
    http.delete('*/api/desk/drafts', () => {
      kept.draft = null;
      return HttpResponse.json(null);
    }),
    http.post('*/api/desk/comparison', async ({ request }) => {
      asked.push(await request.json());
      return HttpResponse.json(kept.compared);
    }),
  );
  const reset = () => {
    server.resetHandlers();
    saved.length = 0;
    asked.length = 0;
    kept.draft = null;
    kept.elsewhere = null;
    kept.compared = { previous: null, comparison: null };
  };
  return { server, saved, asked, kept, reset };
}

export function refuse(status: number, detail: string) {
  return HttpResponse.json({ type: 'about:blank', title: 'refused', status, detail }, { status });
}
