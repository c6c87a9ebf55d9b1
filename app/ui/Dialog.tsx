import { type ReactNode, useEffect, useId, useRef } from "react";
import { Link, useNavigate } from "react-router";

interface DialogProps {
  title: string;
  /** Where the page is without the dialog. The dialog is open because the address says so (`?ask=withdraw`). */
  closeTo: string;
  children: ReactNode;
}

/**
 * A question over the page. Render it when the address asks for it, and link to that address with `#dialog` behind it:
 * without JavaScript it stands open in the flow of the page; with it, it is a modal dialog that Escape closes.
 */
export function Dialog({ title, closeTo, children }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  const navigate = useNavigate();
  useEffect(() => {
    const element = dialog.current;
    if (!element || element.matches(":modal")) return;
    element.close();
    element.showModal();
    // A question that asks for something begins at its field; one that does not begins at the way out.
    element.querySelector<HTMLElement>("input:not([type=hidden]), select, textarea")?.focus();
  }, []);
  return (
    <dialog
      id="dialog"
      ref={dialog}
      open
      aria-labelledby={titleId}
      onCancel={(event) => {
        event.preventDefault();
        navigate(closeTo, { preventScrollReset: true });
      }}
      className="static my-6 w-full border border-ink bg-paper p-6 text-ink modal:fixed modal:m-auto modal:max-h-[90dvh] modal:max-w-words modal:overflow-auto backdrop:bg-ink/50 dark:backdrop:bg-sheet/75"
    >
      <div className="mb-4 flex items-baseline justify-between gap-4 border-b border-rule pb-2">
        <h2 id={titleId}>{title}</h2>
        <Link to={closeTo} preventScrollReset className="tap inline-flex items-center text-sm underline">
          Close
        </Link>
      </div>
      {children}
    </dialog>
  );
}
