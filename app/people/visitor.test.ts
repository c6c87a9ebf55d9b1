import { expect, test } from "vitest";
import { addressOf, neighbourhood } from "./visitor.server.ts";

test("without a proxy the socket counts, whatever the request claims", () => {
  expect(addressOf("203.0.113.9", "198.51.100.4", 0)).toBe("198.51.100.4");
  expect(addressOf(null, "::ffff:198.51.100.4", 0)).toBe("198.51.100.4");
  expect(addressOf(null, "", 0)).toBe("unknown");
});

test("behind proxies only what they wrote themselves is believed", () => {
  expect(addressOf("1.1.1.1, 203.0.113.9", "127.0.0.1", 1)).toBe("203.0.113.9");
  expect(addressOf("1.1.1.1, 203.0.113.9, 10.0.0.1", "127.0.0.1", 2)).toBe("203.0.113.9");
  expect(addressOf(null, "127.0.0.1", 1)).toBe("127.0.0.1");
});

test("the addresses of one IPv6 network are one visitor to a limit, and IPv4 addresses are themselves", () => {
  expect(neighbourhood("2001:db8:1:2:3:4:5:6")).toBe("2001:db8:1:2::/64");
  expect(neighbourhood("2001:0db8:1:2::9")).toBe("2001:db8:1:2::/64");
  expect(neighbourhood("2001:db8::9")).toBe("2001:db8:0:0::/64");
  expect(neighbourhood("fe80::1%eth0")).toBe("fe80:0:0:0::/64");
  expect(neighbourhood("203.0.113.9")).toBe("203.0.113.9");
});
