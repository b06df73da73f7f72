import type { ReactNode } from 'react';
import { Menu, MENU_LINE } from './menu.tsx';

/** One format that something is taken along in: its name, what it is good for, and where the file is. */
export type FormatLink = { readonly name: string; readonly note: string; readonly href: string };

type FormatMenuProps = {
  readonly button: ReactNode;
  /** What the button is called where its words are too few. */
  readonly name?: string;
  readonly buttonClassName: string;
  readonly align: 'left' | 'right';
  /** What is in the file. */
  readonly holds: string;
  readonly links: readonly FormatLink[];
};

/** Files to take along, a line a format. */
export function FormatMenu({ holds, links, name, ...menu }: FormatMenuProps) {
  return (
    <Menu {...menu} {...(name !== undefined && { name })}>
      <p className="px-3 pb-1 text-cap text-ink-3">{holds}</p>
      {links.map((link) => (
        <a key={link.name} download className={MENU_LINE} href={link.href}>
          <span className="w-16 font-medium">{link.name}</span>
          <span className="text-ink-3">{link.note}</span>
        </a>
      ))}
    </Menu>
  );
}
