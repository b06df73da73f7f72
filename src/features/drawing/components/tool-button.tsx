import { useId } from 'react';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { classNames } from '../../../lib/class-names.ts';
import type { Tool } from '../tools.ts';

type ToolButtonProps = {
  readonly tool: Omit<Tool, 'id'> & { readonly id: string };
  readonly isOn: boolean;
  /** Why it cannot be used now. */
  readonly reason: string | null;
  readonly onPress: () => void;
};

/** A tool; its name, key and what is against it stand beside it while it is pointed at. */
export function ToolButton({ tool, isOn, reason, onPress }: ToolButtonProps) {
  const { name, key, path, isApart = false } = tool;
  const id = useId();
  return (
    <div
      className={classNames(
        'group relative',
        isApart &&
          'md:mt-[3px] md:border-t md:border-hairline md:pt-[3px] max-md:ml-[3px] max-md:border-l max-md:border-hairline max-md:pl-[3px]',
      )}
    >
      <button
        type="button"
        aria-label={name}
        aria-pressed={
          tool.id === 'undo' || tool.id === 'redo' || tool.id === 'remove' ? undefined : isOn
        }
        aria-disabled={reason !== null || undefined}
        aria-describedby={reason === null ? undefined : id}
        aria-keyshortcuts={key.replaceAll('Ctrl', 'Control').replaceAll(' ', '+')}
        onClick={onPress}
        className={classNames(
          'grid size-[30px] place-items-center rounded max-md:size-11',
          isOn && 'bg-ink text-ink-on-dark',
          !isOn && reason === null && 'text-ink-2 hover:bg-paper-sunk hover:text-ink',
          !isOn && reason !== null && 'cursor-default text-rule',
        )}
      >
        <svg width="18" height="18" viewBox="0 0 18 18" aria-hidden="true">
          <path d={path} className="fill-none stroke-current" strokeWidth="1.4" />
        </svg>
      </button>
      <div
        role="tooltip"
        id={id}
        className={classNames(
          'pointer-events-none invisible absolute z-10 flex w-max items-center gap-2 rounded border border-rule bg-paper-raised px-2 py-1 text-small whitespace-nowrap text-ink shadow-lift',
          'group-hover:visible group-has-[:focus-visible]:visible md:top-0.5 md:left-[calc(100%+8px)] max-md:hidden',
        )}
      >
        <span className="font-medium">{name}</span>
        <KeyCap>{key}</KeyCap>
        {reason !== null && <span className="text-ink-2">{reason}</span>}
      </div>
    </div>
  );
}
