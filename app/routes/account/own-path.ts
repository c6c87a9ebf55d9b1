/** Where to go after signing in: a path of our own, or the desk. Whatever could lead elsewhere is not followed. */
export function ownPath(to: string | null): string {
  if (!to?.startsWith("/") || to.startsWith("//") || to.includes("\\")) return "/desk";
  const url = new URL(to, "http://own.invalid");
  // "/.//elsewhere" is ours while it is read, and "//elsewhere", which is not, once it is written down.
  const isOwn = url.origin === "http://own.invalid" && !url.pathname.startsWith("//");
  return isOwn ? url.pathname + url.search : "/desk";
}
