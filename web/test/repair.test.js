/** A repair as it is typed, and as the server takes it. */
import assert from "node:assert/strict";
import { test } from "node:test";
import { FIELDS, faultsOfRepair, refusedBy, requestOf, slackOf } from "../outage/repair-order.js";
import { Problem } from "../server/client.js";

/** @typedef {import("../outage/repair-order.js").Typed} Typed */

const typed = (/** @type {Partial<Typed>} */ some) => /** @type {Typed} */ ({
  ...Object.fromEntries(FIELDS.map((field) => [field, ""])),
  cable: "F-1", span: "S-1", first_enclosure: "C-R1", first_structure: "H1", second_enclosure: "C-R2", second_structure: "H2", by: "Dana", reason: "Cut", ...some,
});

test("a repair is whole, or each field that is not says what would be right", () => {
  assert.deepEqual(faultsOfRepair(typed({})), {});
  assert.deepEqual(Object.keys(faultsOfRepair(typed({ cable: "", by: "", length: "far" }))), ["cable", "length", "by"]);
  assert.match(faultsOfRepair(typed({ at: "12" })).span ?? "", /one of the two/);
  assert.match(faultsOfRepair(typed({ span: "" })).span ?? "", /one of the two/);
});

// A foot is 0.3048 m (NIST SP 811, appendix B).
test("lengths go to the server in metres, whatever they were typed in", () => {
  assert.equal(requestOf(typed({ length: "1,000" }), "ft").piece?.length_m, 304.8);
  assert.equal(requestOf(typed({ span: "", at: "100" }), "ft").at_m, 30.48);
  assert.equal(requestOf(typed({ length: "170" }), "m").piece?.length_m, 170);
  assert.equal("length_m" in (requestOf(typed({}), "m").piece ?? {}), false);
});

test("slack used becomes slack left, and no coil gives more than it holds", () => {
  const seam = (/** @type {string} */ structure, /** @type {number} */ held) => ({ enclosure: "C", structure, a: "a", b: "b", count: 1, slack_before_m: held, slack_after_m: held });
  const joined = [seam("H1", 30.48), seam("H2", 6)];
  assert.deepEqual(slackOf(typed({ first_slack: "65" }), "ft", joined), { slack: [{ structure: "H1", left_m: 10.668 }], short: {} });
  assert.deepEqual(slackOf(typed({ second_slack: "6.1", first_slack: "30.48" }), "m", joined), { slack: [{ structure: "H1", left_m: 0 }], short: { second_slack: 6 } });
});

test("each refusal stands by its own fields", () => {
  const faults = [{ line: 0, column: "piece", text: "Too short." }, { line: 0, column: "second", text: "Not there." }, { line: 0, column: "seq", text: "Else." }];
  assert.deepEqual(refusedBy(new Problem("refused", "All.", "", /** @type {any} */ (faults))), { piece: "Too short.", second: "Not there.", rest: "Else." });
});
