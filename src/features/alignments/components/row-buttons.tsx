import { Button } from '../../../components/ui/button.tsx';

/** Takes a row of a list away; `named` says which for those who do not see where it stands. */
export function RemoveRow({
  named,
  onClick,
}: {
  readonly named: string;
  readonly onClick: () => void;
}) {
  return (
    <Button kind="quiet" aria-label={`Remove ${named}`} onClick={onClick}>
      ×
    </Button>
  );
}

/** Under a list: one row more. */
export function AddRow({
  children,
  onClick,
}: {
  readonly children: string;
  readonly onClick: () => void;
}) {
  return (
    <Button kind="quiet" className="-ml-1.5" onClick={onClick}>
      {children}
    </Button>
  );
}
