import assert from "node:assert/strict";
import { messageOf } from "../../src/contract/words.js";
import { readRecord } from "../../src/record/readRecord.js";
import { readBack, sampleRecord } from "./sampleRecord.js";

const uri = "file:///a.raterecord";

/** The code with which a text is refused. */
function refusal(text: string): string {
  const read = readRecord(text, uri);
  return read.ok ? "read" : read.problem.code;
}

describe("reading a record", () => {
  let text = "";
  before(async () => {
    text = await sampleRecord("ester");
  });

  it("gives back what was written", () => {
    const record = readBack(text);
    assert.deepEqual(record, JSON.parse(text));
    assert.equal(record.runs[0]?.fits[0]?.parameters[0]?.name, "k");
  });

  it("takes any line ends and any order of keys, and passes over keys it does not know", () => {
    assert.equal(refusal(text.replaceAll("\n", "\r\n")), "read");
    const { raterecord, ...rest } = JSON.parse(text) as Record<string, unknown>;
    assert.equal(refusal(JSON.stringify({ later: 1, ...rest, raterecord })), "read");
  });

  it("record-cut-off: wherever the text ends too soon", () => {
    assert.equal(refusal(""), "record-cut-off");
    for (let end = 1; end < text.length - 2; end += 97) assert.equal(refusal(text.slice(0, end)), "record-cut-off");
  });

  it("record-unmerged: the marks of a merge", () => {
    const [first = "", ...rest] = text.split("\n");
    const marked = [first, "<<<<<<< HEAD", '  "method": "1",', "=======", '  "method": "2",', ">>>>>>> other", ...rest];
    assert.equal(refusal(marked.join("\n")), "record-unmerged");
  });

  it("record-broken: no JSON any more", () => {
    assert.equal(refusal(text.replace('"language": 1,', '"language": 1')), "record-broken");
    assert.equal(refusal("k = 1.2(1) s^-1\n"), "record-broken");
  });

  it("record-foreign: something else, or a record that lacks something, with what it is", () => {
    for (const other of ["[]", "3", "null", "{}", '{"raterecord":"1"}', '{"raterecord":0}']) {
      assert.equal(refusal(other), "record-foreign", other);
    }
    const lacking = readRecord(text.replace('"stop": "converged",', ""), uri);
    assert.ok(!lacking.ok);
    assert.equal(
      messageOf(lacking.problem),
      "This is no record as Ratewright writes it: runs[0].fits[0] lacks stop. Give another name to what it is, or write the record anew.",
    );
    const wrong = readRecord(text.replace('"stop": "converged"', '"stop": "tired"'), uri);
    assert.ok(!wrong.ok && messageOf(wrong.problem).includes("runs[0].fits[0].stop is not converged or limit"));
  });

  it("record-newer: a form of later versions, whatever else is in it", () => {
    assert.equal(refusal('{"raterecord":2}'), "record-newer");
    assert.equal(refusal(text.replace('"raterecord": 1', '"raterecord": 7')), "record-newer");
  });
});
