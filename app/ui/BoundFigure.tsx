import { Link } from "react-router";

interface BoundFigureProps {
  children: string;
  /** The record that the number comes from. */
  to?: string;
}

/** A number inside a text that is bound to a record and not typed. */
export function BoundFigure({ children, to }: BoundFigureProps) {
  const look = "bound-figure border-b-2 border-vermilion bg-vermilion-wash box-decoration-clone px-0.5";
  if (!to) return <span className={look}>{children}</span>;
  return (
    <Link to={to} className={`${look} no-underline hover:bg-paper-shade`}>
      {children}
    </Link>
  );
}
