import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { App } from 'antd';
import { MemoryRouter } from 'react-router-dom';
import { SWRConfig } from 'swr';
import { vi } from 'vitest';
import { DraftEditor } from '../components/draft-editor';
import { draftFieldId } from '../model/field-id';
import type { Opening } from '../model/opening';

const PERSON = { id: 'p-engineer', name: 'Edda Krantz' };

/** Draws the form for a draft, as its page does. */
export function renderDraft(opening: Opening) {
  const onEntered = vi.fn();
  const onSubmitted = vi.fn();
  const user = userEvent.setup();
  const view = render(
    <SWRConfig value={{ provider: () => new Map(), dedupingInterval: 0 }}>
      <MemoryRouter>
        <App component={false}>
          <DraftEditor opening={opening} person={PERSON} onEntered={onEntered} onSubmitted={onSubmitted} />
        </App>
      </MemoryRouter>
    </SWRConfig>,
  );
  return { user, onEntered, onSubmitted, ...view };
}

type Control = HTMLInputElement | HTMLTextAreaElement | HTMLSelectElement;

/** The control for a place in the definition. */
export function control(path: string): Control {
  const found = document.getElementById(draftFieldId(path));
  if (
    found instanceof HTMLInputElement ||
    found instanceof HTMLTextAreaElement ||
    found instanceof HTMLSelectElement
  )
    return found;
  throw new Error(`there is no control for ${path}`);
}

/**
 * The button that is called so. Asking by role costs seconds in a form of this size, since every element's style is
 * worked out for it.
 */
export function button(name: string | RegExp): HTMLButtonElement {
  const called = (one: Element) => one.getAttribute('aria-label') ?? one.textContent.trim();
  const found = [...document.querySelectorAll('button')].filter((one) =>
    typeof name === 'string' ? called(one) === name : name.test(called(one)),
  );
  const [only, ...others] = found;
  if (only === undefined || others.length > 0) throw new Error(`${found.length} buttons are called ${name}`);
  return only;
}
