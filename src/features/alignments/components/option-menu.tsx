import { Menu, MENU_LINE } from '../../../components/ui/menu.tsx';
import type { PlanLine } from '../hooks/use-plan-line.ts';

type OptionMenuProps = { readonly line: Pick<PlanLine, 'options' | 'option' | 'choose'> };

/** Which option is shown on the map. */
export function OptionMenu({ line: { options, option, choose } }: OptionMenuProps) {
  const name = option?.name ?? 'No option';
  return (
    <Menu
      align="left"
      name={`${name}, choose another option`}
      button={
        <>
          <b>{name}</b> <span aria-hidden="true">▾</span>
        </>
      }
      buttonClassName="-my-1 flex min-h-6 items-center gap-1 hover:text-ink max-sm:min-h-11"
    >
      {[...options, null].map((one) => (
        <button
          key={one?.id ?? 'none'}
          type="button"
          aria-pressed={one?.id === option?.id}
          className={MENU_LINE}
          onClick={() => {
            choose(one?.id ?? null);
          }}
        >
          <span aria-hidden="true" className="w-3">
            {one?.id === option?.id ? '✓' : ''}
          </span>
          {one?.name ?? 'No option'}
        </button>
      ))}
    </Menu>
  );
}
