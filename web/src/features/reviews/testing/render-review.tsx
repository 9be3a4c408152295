import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { SWRConfig } from 'swr';
import { vi } from 'vitest';
import type { Review } from '../../../shared/api/types';
import { ReviewArticle } from '../components/review-article';
import { useReviewActs } from '../hooks/use-review-acts';

function ReviewUnderTest({ review }: { review: Review }) {
  const acts = useReviewActs(review);
  return (
    <ReviewArticle
      review={review}
      acts={acts}
      check={(place) => <p>check {place}</p>}
      differences={({ number }) => <p>what iteration {number} changed</p>}
    />
  );
}

/** Draws a review as its page does. */
export function renderReview(review: Review) {
  const user = userEvent.setup();
  const view = render(
    <SWRConfig value={{ provider: () => new Map() }}>
      <MemoryRouter>
        <ReviewUnderTest review={review} />
      </MemoryRouter>
    </SWRConfig>,
  );
  return { user, ...view };
}

export interface Asked {
  method: string;
  path: string;
  body: unknown;
  ifMatch: string | null;
}

/** Stands in for the server: notes what it is asked and answers every act with `status` and `body`. */
export function serveActs(status = 201, body: unknown = {}): Asked[] {
  const asked: Asked[] = [];
  vi.stubGlobal('fetch', async (call: Request) => {
    const { pathname } = new URL(call.url);
    if (call.method === 'GET')
      return new Response('{"items":[]}', { status: pathname.endsWith('session') ? 401 : 200 });
    asked.push({
      method: call.method,
      path: pathname,
      body: JSON.parse((await call.text()) || 'null') as unknown,
      ifMatch: call.headers.get('if-match'),
    });
    return new Response(JSON.stringify(body), { status });
  });
  return asked;
}
