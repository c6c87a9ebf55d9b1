import type { ComponentProps } from "react";
import { type ButtonLook, buttonClass } from "./button-look.ts";

export interface ButtonProps extends ComponentProps<"button"> {
  look?: ButtonLook;
}

/** A button that does something on the page. One that sends a form is a `SubmitButton`. */
export function Button({ look, className, type = "button", ...rest }: ButtonProps) {
  return <button {...rest} type={type} className={buttonClass(look, className)} />;
}
