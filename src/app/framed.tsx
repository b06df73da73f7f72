import type { ReactNode } from 'react';
import { Outlet } from 'react-router-dom';
import { Content } from '../components/layout/content.tsx';
import { TopBar } from './top-bar.tsx';

/** A page outside of schemes, under the bar. */
export function Framed({ children }: { readonly children: ReactNode }) {
  return (
    <>
      <TopBar />
      <Content>{children}</Content>
    </>
  );
}

/** The pages outside of schemes. */
export function FramedPages() {
  return (
    <Framed>
      <Outlet />
    </Framed>
  );
}
