import { type ReactNode, useEffect, useRef } from "react";

interface NightDialogProps {
  title: string;
  onClose: () => void;
  children: ReactNode;
}

/** A sheet over the kiosk's page; touching beside it, or Escape, closes it. */
export function NightDialog({ title, onClose, children }: NightDialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  useEffect(() => {
    if (!dialog.current?.open) dialog.current?.showModal();
  }, []);
  return (
    // biome-ignore lint/a11y/useKeyWithClickEvents: Escape closes it by onCancel; the click is for the ground beside it
    <dialog
      ref={dialog}
      aria-label={title}
      onCancel={onClose}
      onClick={(event) => {
        if (event.target === dialog.current) onClose();
      }}
      className="night m-auto max-h-[90dvh] w-[min(44rem,92vw)] overflow-auto border border-ink p-8 text-ink backdrop:bg-night/80"
    >
      <h2 className="mb-4 text-2xl">{title}</h2>
      {children}
    </dialog>
  );
}
