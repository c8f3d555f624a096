/** The pages' types are those of the contract. */
import assert from "node:assert/strict";
import { test } from "node:test";
import { contractTypes, keptTypes } from "./contract-types.js";

test("the types that the pages are checked with are written from the contract as it is", () => {
  assert.equal(keptTypes(), contractTypes(), "run: node test/contract-types.js");
});
