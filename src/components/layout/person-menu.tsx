import { Link } from 'react-router-dom';
import { Chevron } from '../ui/chevron.tsx';
import { KeyCap } from '../ui/key-cap.tsx';
import { Menu, MENU_LINE } from '../ui/menu.tsx';

type PersonMenuProps = {
  readonly name: string;
  readonly links: readonly { readonly to: string; readonly label: string }[];
  readonly onShowKeys: () => void;
  readonly onSignOut: () => void;
};

function Figure() {
  return (
    <svg width="18" height="18" aria-hidden="true" className="fill-none stroke-ink md:hidden">
      <circle cx="9" cy="6" r="3.3" strokeWidth="1.4" />
      <path d="M2.5 16.5c.6-4 3.2-5.6 6.5-5.6s5.9 1.6 6.5 5.6" strokeWidth="1.4" />
    </svg>
  );
}

/** Who is signed in; pressed, what is theirs. */
export function PersonMenu({ name, links, onShowKeys, onSignOut }: PersonMenuProps) {
  return (
    <Menu
      align="right"
      name={`${name}: account and sign out`}
      buttonClassName="flex h-bar min-w-0 items-center gap-2 text-small text-ink-2 hover:text-ink max-md:min-w-touch max-md:justify-center"
      button={
        <>
          <span className="max-w-[170px] truncate max-lg:max-w-[110px] max-md:hidden">{name}</span>
          <Figure />
          <Chevron />
        </>
      }
    >
      <p className="border-b border-hairline px-3 pt-1 pb-2 text-cap text-ink-3 md:hidden">
        {name}
      </p>
      <ul>
        {links.map(({ to, label }) => (
          <li key={to}>
            <Link to={to} className={MENU_LINE}>
              {label}
            </Link>
          </li>
        ))}
        <li className="max-md:hidden">
          <button type="button" className={MENU_LINE} onClick={onShowKeys}>
            Keys here
            <span className="ml-auto">
              <KeyCap>?</KeyCap>
            </span>
          </button>
        </li>
        <li className="mt-1 border-t border-hairline pt-1">
          <button type="button" className={MENU_LINE} onClick={onSignOut}>
            Sign out
          </button>
        </li>
      </ul>
    </Menu>
  );
}
