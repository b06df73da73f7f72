import { useRef, type ReactNode } from 'react';
import { Button } from './button.tsx';

type FileButtonProps = {
  /** What the button is called where several stand on a page. */
  readonly label: string;
  readonly accept: string;
  /** On a phone, opens the camera that looks away from the person. */
  readonly camera?: boolean;
  readonly onFile: (file: File) => void;
  readonly children: ReactNode;
};

/** Asks for a file. */
export function FileButton({ label, accept, camera = false, onFile, children }: FileButtonProps) {
  const input = useRef<HTMLInputElement>(null);
  return (
    <>
      <input
        ref={input}
        type="file"
        accept={accept}
        {...(camera && { capture: 'environment' as const })}
        className="hidden"
        aria-label={label}
        onChange={({ target }) => {
          const file = target.files?.[0];
          // so that the same file, mended, can be chosen again
          target.value = '';
          if (file !== undefined) onFile(file);
        }}
      />
      <Button aria-label={label} onClick={() => input.current?.click()}>
        {children}
      </Button>
    </>
  );
}
