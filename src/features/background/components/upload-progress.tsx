import { Progress } from '../../../components/ui/progress.tsx';
import type { UploadProgress as Sent } from '../../../lib/api-upload.ts';

type UploadProgressProps = {
  readonly name: string;
  readonly progress: Sent;
  readonly onCancel: () => void;
};

function inKilobytes(bytes: number): number {
  return Math.ceil(bytes / 1024);
}

/** How much of a file has gone; once all has, the server reads it. */
export function UploadProgress({ name, progress, onCancel }: UploadProgressProps) {
  const { sent, total } = progress;
  return (
    <Progress
      label={`${sent < total ? 'Sending' : 'Reading'} ${name.toLowerCase()}`}
      done={inKilobytes(sent)}
      total={inKilobytes(total)}
      unit="kB"
      onCancel={onCancel}
    />
  );
}
