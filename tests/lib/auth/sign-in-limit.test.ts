/** Guards the limit of failed sign-ins and whose address is counted. */
import { describe, expect, it } from "vitest";
import { networkAddress } from "@/lib/auth/network-address";
import { mayTry, SIGN_IN_LIMIT } from "@/lib/auth/sign-in-limit";

describe("failed sign-ins", () => {
  it("are let through up to the limit of an e-mail and of an address", () => {
    const { perEmail, perAddress } = SIGN_IN_LIMIT;
    expect(mayTry({ ofEmail: perEmail, ofAddress: perAddress })).toBe(true);
    expect(mayTry({ ofEmail: perEmail + 1, ofAddress: 1 })).toBe(false);
    expect(mayTry({ ofEmail: 1, ofAddress: perAddress + 1 })).toBe(false);
  });
});

describe("the address a request came from", () => {
  it("is the entry of the nearest server, not what the sender claims", () => {
    expect(networkAddress("1.1.1.1, 2.2.2.2")).toBe("2.2.2.2");
    expect(networkAddress("::1")).toBe("::1");
  });

  it.each([null, undefined, "", " , "])("is one and the same for %j", (header) => {
    expect(networkAddress(header)).toBe("unknown");
  });
});
