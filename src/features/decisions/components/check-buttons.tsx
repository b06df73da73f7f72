import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { Button } from '../../../components/ui/button.tsx';

type CheckButtonsProps = {
  readonly may: number;
  readonly own: number;
  readonly busy: boolean;
  /** Whether it is said why. */
  readonly mayReturn: boolean;
  readonly onSettle: (verdict: 'checked' | 'returned') => void;
  readonly onWithdraw: () => void;
};

/** What can be done with what waits. */
export function CheckButtons(props: CheckButtonsProps) {
  const { may, own, busy, mayReturn, onSettle, onWithdraw } = props;
  return (
    <div className="flex flex-wrap gap-2">
      <Button
        kind="main"
        busy={busy}
        disabled={may === 0}
        onClick={() => {
          onSettle('checked');
        }}
      >
        {`Check ${formatCount(may)}`}
      </Button>
      <Button
        busy={busy}
        disabled={may === 0 || !mayReturn}
        onClick={() => {
          onSettle('returned');
        }}
      >
        {`Return ${formatCount(may)}`}
      </Button>
      {own > 0 && (
        <Button busy={busy} onClick={onWithdraw}>
          {`Withdraw ${formatCount(own)} of mine`}
        </Button>
      )}
    </div>
  );
}
