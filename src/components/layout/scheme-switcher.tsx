import { Link } from 'react-router-dom';
import { Chevron } from '../ui/chevron.tsx';
import { Menu, MENU_LINE } from '../ui/menu.tsx';

type SchemeName = { readonly id: string; readonly name: string };

type SchemeSwitcherProps = {
  readonly current: SchemeName;
  readonly others: readonly SchemeName[];
  readonly pathOf: (id: string) => string;
};

/** The scheme at hand; pressed, the others. */
export function SchemeSwitcher({ current, others, pathOf }: SchemeSwitcherProps) {
  return (
    <Menu
      align="left"
      className="mr-1.5 min-w-0 border-x border-hairline max-md:mr-0 max-md:flex-1 max-md:border-r-0"
      name={`${current.name}: other schemes`}
      buttonClassName="flex min-w-0 items-center gap-2 px-3.5 font-semibold max-md:px-2.5"
      button={
        <>
          <span className="max-w-[min(280px,22vw)] truncate max-md:max-w-none" title={current.name}>
            {current.name}
          </span>
          <Chevron />
        </>
      }
    >
      <ul>
        {others.map(({ id, name }) => (
          <li key={id}>
            <Link to={pathOf(id)} className={MENU_LINE}>
              {name}
            </Link>
          </li>
        ))}
        <li>
          <Link to="/" className={MENU_LINE}>
            {others.length === 0 ? 'All schemes' : 'All schemes, and what waits for you'}
          </Link>
        </li>
      </ul>
    </Menu>
  );
}
