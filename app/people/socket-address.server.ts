import { AsyncLocalStorage } from "node:async_hooks";
import { subscribe } from "node:diagnostics_channel";

// The framework hands a web Request on, without the socket it came by. Node itself tells of every request on a
// diagnostics channel, in the context in which the request is then answered; so the address waits there.

const addresses = new AsyncLocalStorage<string>();

subscribe("http.server.request.start", (message) => {
  const { socket } = message as { socket?: { remoteAddress?: string } };
  addresses.enterWith(socket?.remoteAddress ?? "");
});

/** The other end of the connection by which the present request came; "" outside a request. */
export function socketAddress(): string {
  return addresses.getStore() ?? "";
}
