/** Addresses of views. */
import assert from "node:assert/strict";
import { test } from "node:test";
import { formatAddress, parseAddress } from "../address/address.js";

test("an address that was written opens the same thing again", () => {
  for (const hash of [
    "#/start",
    "#/enclosure/C-S02?trace=circuit:RC-01&nm=1310,1550&as_of=41&as_if=J-77",
    "#/circuit/RC-01?path=2&nm=1310",
    "#/port/HE-1-F/FS/12",
    "#/fiber/FDR-S-1:25",
    "#/structure/HH-0044",
    "#/outage/reading?trace=port:HE-1/FDR-S/72&port=HE-1/FDR-S/72&distance=7412&event=C-S03=6038&event=C-S04=8155",
    "#/outage/down?as_of=41&cut=place:FDR-S-2@1352.2&cut=tube:FDR-S-1/2",
    "#/cable/Kabel-%C3%84%26B?as_of=2026-03-31T14:05",
  ]) {
    assert.equal(formatAddress(parseAddress(hash)), hash);
  }
});

test("a circuit, a port and a fiber have a path of their own", () => {
  assert.equal(parseAddress("#/circuit/RC-01").trace, "circuit:RC-01");
  assert.equal(parseAddress("#/port/E1/P/1?trace=circuit:RC-01").trace, "port:E1/P/1");
  assert.equal(parseAddress("#/enclosure/E1?trace=circuit:RC-01").trace, "circuit:RC-01");
  assert.equal(parseAddress("#/enclosure/E1").trace, "");
});

test("what a view is asked stays in order, apart from what is common to all views", () => {
  const { code, asked } = parseAddress("#/outage/down?cut=span:S-2&nm=1310&cut=span:S-1&as_of=3");
  assert.equal(code, "down");
  assert.deepEqual(asked, [["cut", "span:S-2"], ["cut", "span:S-1"]]);
});

test("what cannot be read opens the start", () => {
  for (const hash of ["", "#", "#/nowhere/at/all", "#%%%", "#/?nm=x,-1,0"]) {
    const address = parseAddress(hash);
    assert.equal(address.view, "start");
    assert.deepEqual(address.nm, []);
    assert.equal(address.path, 0);
  }
});

test("a code that is not well encoded is taken as it stands", () => {
  assert.equal(parseAddress("#/structure/50%25").code, "50%");
  assert.equal(parseAddress("#/structure/50%").code, "50%");
});
