interface ProgressProps {
  id: string;
  label: string;
  /** Between 0 and `max`; none while nothing is known yet. */
  value?: number;
  max?: number;
  /** "312 of 1,204 rows", already in words. */
  text: string;
}

export function Progress({ id, label, value, max = 1, text }: ProgressProps) {
  return (
    <div className="grid gap-1">
      <div className="flex justify-between gap-4 text-sm">
        <label htmlFor={id} className="font-head font-medium">
          {label}
        </label>
        <span className="num text-ink-soft">{text}</span>
      </div>
      <progress id={id} value={value} max={max} className="progress">
        {text}
      </progress>
    </div>
  );
}
