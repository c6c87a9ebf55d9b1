import { Link, type LinkProps } from "react-router";
import { type ButtonLook, buttonClass } from "./button-look.ts";

export interface LinkButtonProps extends LinkProps {
  look?: ButtonLook;
}

/** A link that leads to where something is done, with the weight of a button. */
export function LinkButton({ look, className, ...rest }: LinkButtonProps) {
  return <Link {...rest} className={buttonClass(look, className)} />;
}
