import { useEffect, useRef } from 'react';
import { Outlet, ScrollRestoration, useLocation, useNavigation } from 'react-router-dom';
import { Masthead } from './masthead';
import './page-frame.css';

/** What surrounds every page: skip link, masthead, main. A new page takes the focus, so that it is announced. */
export function PageFrame() {
  const main = useRef<HTMLElement>(null);
  const { pathname } = useLocation();
  const before = useRef(pathname);
  const moving = useNavigation().state !== 'idle';

  useEffect(() => {
    if (before.current !== pathname) main.current?.focus({ preventScroll: true });
    before.current = pathname;
  }, [pathname]);

  return (
    <>
      <a className="skip-link" href="#main">
        Skip to the page
      </a>
      <Masthead />
      <main id="main" ref={main} tabIndex={-1} aria-busy={moving}>
        <Outlet />
      </main>
      <ScrollRestoration />
    </>
  );
}
