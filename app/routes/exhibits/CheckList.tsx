import { StateMark } from "#app/ui/StateMark.tsx";

interface CheckListProps {
  checks: readonly { level: "blocks" | "warns"; sceneId: string | null; message: string }[];
  /** How to call a scene, before its check. */
  sceneName?: (sceneId: string) => string;
}

/** What blocks a sign-off, then what deserves a look. */
export function CheckList({ checks, sceneName }: CheckListProps) {
  if (checks.length === 0) return <p>Nothing blocks, and nothing warns.</p>;
  const ordered = [...checks].sort((a, b) => a.level.localeCompare(b.level));
  return (
    <ul className="border-t border-rule">
      {ordered.map((check) => (
        <li key={`${check.sceneId} ${check.message}`} className="flex items-baseline gap-4 border-b border-rule py-2">
          <span className="w-14 shrink-0">
            <StateMark tone={check.level === "blocks" ? "person" : "none"}>{check.level}</StateMark>
          </span>
          <span>
            {check.sceneId && sceneName ? <strong>{sceneName(check.sceneId)}: </strong> : null}
            {check.message}
          </span>
        </li>
      ))}
    </ul>
  );
}
