import assert from "node:assert/strict";
import { createHash } from "node:crypto";
import fc from "fast-check";
import { contentHash } from "../../src/data/contentHash.js";

const ascii = (text: string): Uint8Array => new TextEncoder().encode(text);

describe("content hash", () => {
  // NIST, "Examples with Intermediate Values", SHA-256, for FIPS 180-4: the messages of one and of two blocks
  it("equals the examples of the standard", () => {
    assert.equal(contentHash(ascii("abc")), "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad");
    assert.equal(
      contentHash(ascii("abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq")),
      "248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1",
    );
  });

  // NIST CAVP, SHA-256 short messages, length 0; and the million letters a of FIPS 180-2, appendix B.3
  it("equals the published hashes of nothing and of a million letters a", () => {
    assert.equal(contentHash(new Uint8Array(0)), "e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855");
    assert.equal(
      contentHash(ascii("a".repeat(1_000_000))),
      "cdc76e5c9914fb9281a1c7e284d73e67f1809a48a497200e046d39ccc7112cd0",
    );
  });

  it("equals OpenSSL, which Node carries, on any bytes", () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 300 }), (bytes) => {
        assert.equal(contentHash(bytes), createHash("sha256").update(bytes).digest("hex"));
      }),
      { seed: 20261103, numRuns: 500 },
    );
  });

  it("hashes a view of a larger buffer", () => {
    assert.equal(contentHash(ascii("xxabcxx").subarray(2, 5)), contentHash(ascii("abc")));
  });
});
