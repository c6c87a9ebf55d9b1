import { useNavigation } from "react-router";
import { Notice } from "#app/ui/Notice.tsx";
import { Table } from "#app/ui/Table.tsx";

interface TheirsAndYoursProps {
  /** Field name -> what people call it, in the order of the form. */
  labels: Readonly<Record<string, string>>;
  /** As it stands now, after the other person's save. */
  theirs: Readonly<Record<string, string | number | null | undefined>>;
  /** As it was typed. */
  yours: Readonly<Record<string, string>>;
  /** How a field's value is said where it is not said as it is kept (an id, a code). */
  say?: (field: string, value: string) => string;
}

/** Somebody else saved first: what they kept beside what was typed. The form below still holds what was typed. */
export function TheirsAndYours({ labels, theirs, yours, say = (_, value) => value }: TheirsAndYoursProps) {
  // The refusal is here a moment before the page has been read again: until then "theirs" would be what it was.
  const reading = useNavigation().state !== "idle";
  if (reading) return null;
  const rows = Object.entries(labels)
    .map(([field, label]) => ({
      field,
      label,
      theirs: theirs[field]?.toString() ?? "",
      yours: (yours[field] ?? "").replaceAll("\r\n", "\n").trim(),
    }))
    .filter((row) => row.theirs !== row.yours);
  const shown = (field: string, value: string) =>
    value === "" ? <span className="text-ink-soft">nothing</span> : say(field, value);
  return (
    <Notice
      tone="warning"
      title="Somebody else saved this while you were typing"
      // The table lies on the notice's own ground.
      className="[&_thead]:static [&_thead]:bg-transparent"
    >
      <p className="mb-3">
        What you typed is still in the form below. Take over from theirs what should stay, then save again: the form is
        kept as it then stands.
      </p>
      {rows.length > 0 ? (
        <Table
          caption="Where the two differ"
          captionHidden
          rows={rows}
          rowKey={(row) => row.field}
          columns={[
            { id: "field", head: "Field", rowHead: true, cell: (row) => row.label },
            { id: "theirs", head: "Theirs, as kept", cell: (row) => shown(row.field, row.theirs) },
            { id: "yours", head: "Yours, in the form", cell: (row) => shown(row.field, row.yours) },
          ]}
        />
      ) : (
        <p>They saved the same as you typed.</p>
      )}
    </Notice>
  );
}
