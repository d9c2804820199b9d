import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { readBox, sealAad, sealSuite, toBase64, writeBox } from "@/lib/kiosks/seal-format";

const bytes = (hex: string) => Uint8Array.from(Buffer.from(hex, "hex"));

/** RFC 9180 appendix A.1.1: DHKEM(X25519, HKDF-SHA256), HKDF-SHA256, AES-128-GCM, base mode. */
const vector = {
  info: "4f6465206f6e2061204772656369616e2055726e",
  enc: "37fda3567bdbd628e88668c3c8d7e97d1d1253b6d4ea6d44c150f741f1bf4431",
  skRm: "4612c550263fc8ad58375df3f557aac531d26850903e55a9f23f21d8534e8ac8",
  pkRm: "3948cfe0ad1ddb695d780e59077195da6c56506b027329794ab02bca80815c4d",
  aad: "436f756e742d30",
  pt: "4265617574792069732074727574682c20747275746820626561757479",
  ct: "f938558b5d72f1a23810b4be2ab4f84331acc02fc97babc53a52ae8218a355a96d8770ac83d07bea87e13c512a",
};

describe("sealSuite", () => {
  test("opens the base mode vector of RFC 9180 A.1.1", async () => {
    const recipientKey = await sealSuite.kem.importKey("raw", bytes(vector.skRm).buffer, false);
    const opened = await sealSuite.open(
      { recipientKey, enc: bytes(vector.enc), info: bytes(vector.info) },
      bytes(vector.ct),
      bytes(vector.aad),
    );
    expect(Buffer.from(opened).toString("hex")).toBe(vector.pt);
  });

  test("derives the public key of RFC 9180 A.1.1 from the input key material", async () => {
    const ikm = "6db9df30aa07dd42ee5e8181afdb977e538f5e1fec8a06223f33f7013e525037";
    const pair = await sealSuite.kem.deriveKeyPair(bytes(ikm));
    const key = await sealSuite.kem.serializePublicKey(pair.publicKey);
    expect(Buffer.from(key).toString("hex")).toBe(vector.pkRm);
  });
});

describe("readBox", () => {
  const kid = fc.stringMatching(/^[\w-]{1,64}$/);
  const sealed = fc.uint8Array({ minLength: 1, maxLength: 200 });
  const enc = fc.uint8Array({ minLength: 32, maxLength: 32 });

  test("reads back every box that was written", () => {
    fc.assert(
      fc.property(fc.record({ kid, enc, sealed }), (box) => {
        expect(readBox(writeBox(box))).toEqual(box);
      }),
    );
  });

  test.each([
    ["", "nothing"],
    ["v2.key.AAAA", "another version"],
    ["v1.key", "a part is missing"],
    [`v1.key.${toBase64(new Uint8Array(32))}`, "nothing is sealed"],
    [`v1..${toBase64(new Uint8Array(60))}`, "no key is named"],
    ["v1.key.AAAAA", "base64 is cut off"],
    ["v1.key.AA-_AA", "another alphabet"],
  ])("is null for %j: %s", (text) => expect(readBox(text)).toBeNull());
});

describe("sealAad", () => {
  test("differs wherever one part differs, also where parts run together", () => {
    const one = { siteId: "s", kioskId: "k", worker: "12", session: "3" };
    const other = { siteId: "s", kioskId: "k", worker: "1", session: "23" };
    expect(sealAad(one)).not.toEqual(sealAad(other));
    expect(sealAad(one)).toEqual(sealAad({ ...one }));
  });
});
