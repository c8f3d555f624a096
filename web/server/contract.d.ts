// Written from schema/openapi.json by test/contract-types.js: change the contract, not this file.

export type SpareOption = {
  /** A path each: its glass from the one structure to the other in order, such as F-1:229 */
  fibers: Array<Array<string>>;
  /** A path each: where it begins and ends, at a port if it has one, else at the end of a fiber */
  ends: Array<Array<string>>;
  /** Whether every path lies in one tube throughout each cable */
  same_tube: boolean;
  /** Of all paths together */
  new_splices: number;
  /** Of all paths together, between ports of one structure on the way */
  new_jumpers: number;
  /** Where a new splice must be made */
  enclosures_opened: Array<string>;
  /** The longest path's, from the port's rear to the port's rear */
  glass_m: number;
  /** The worst path's, expected at 1550 nm, the connectors at its two ends apart; null where a fiber on it has no loss at that wavelength */
  loss_db: number | null;
  /** Whether every joint that is there on the way is verified */
  verified: boolean;
  /** Of all paths together */
  unverified_joints: number;
  /** In order; all paths travel the same */
  spans: Array<string>;
};

export type SparesAnswer = {
  /** The last posting that this answer takes in; 0 where the records are empty */
  posting: number;
  options: Array<SpareOption>;
};

export type Alarms = {
  /** Circuits that are down */
  down: Array<string>;
  /** Circuits that are up */
  up?: Array<string>;
  /** Whether a protected circuit that is up is known to be so on its own path */
  by_path?: boolean;
  /** Enclosures that a crew is known to have opened lately: joints may be crossed there */
  opened?: Array<string>;
};

export type BaseMap = {
  type: "FeatureCollection";
  /** True where small features were left out because of the zoom */
  truncated: boolean;
  features: Array<{
    type: "Feature";
    geometry: {
      /** GeoJSON type */
      type: "Point" | "LineString" | "Polygon" | "MultiLineString" | "MultiPolygon";
      /** As in RFC 7946 */
      coordinates: Array<any>;
    };
    properties: {
      /** What it is: street, road, track, rail, water, river, place, boundary, wood, building, or the operator's own word */
      kind: string;
      /** Its name */
      name: string | null;
      /** 1 most important ... 5 least; null where not given */
      rank: number | null;
    };
  }>;
};

export type Budget = {
  /** Class code, where the budget is one */
  class: string | null;
  /** Most, dB */
  max_db: number;
  /** Least, for a PON class, dB */
  min_db: number | null;
  /** Margin kept, dB */
  margin_db: number;
  /** Expected sum at most max less margin */
  passes: boolean;
  /** What is left of max less margin after the expected sum, dB */
  left_db: number;
  /** Limit sum at most max less margin */
  passes_at_limit: boolean;
  /** Expected sum below min */
  overload: boolean;
  /** Where the class comes from */
  source?: string;
};

export type Cable = {
  /** Code */
  code: string;
  type: CableType;
  /** Longer cable that this reel is part of */
  part_of: string | null;
  /** Set of marks that governs */
  marks_ink: string;
  /** Excess length that holds for this reel, per cent */
  overlength_pct: number;
  /** Where that comes from */
  overlength_source: string;
  reel: string | null;
  /** When laid */
  installed_on: string | null;
  state: PlantState;
  note: string | null;
  /** Sheath, end to end, metres */
  sheath_m: number;
  /** Route, end to end, metres */
  route_m: number;
  /** Sheath in coils, metres */
  slack_m: number;
  length_basis: LengthBasis;
  tubes: Array<{
    tube: number;
    /** In words */
    color: string;
    /** Numbers as in the records folder: one number, or a range that rises or falls */
    fibers: string;
  }>;
  /** Colour of each place in a tube, in words */
  fiber_colors: Array<string>;
  /** The run, from its start */
  rows: Array<CableRow>;
  line: Line;
  sections: Array<CableSection>;
  /** What this reel's glass is reckoned at, by wavelength */
  values: Array<{
    wavelength_nm: number;
    group_index: number | null;
    loss_db_per_km: number | null;
    /** Reel sheet or type table */
    source: string;
  }>;
  flags: Array<{
    /** Numbers as in the records folder: one number, or a range that rises or falls */
    fibers: string;
    /** Flag */
    flag: "dead" | "suspect" | "leased" | "reserved";
    /** Enclosure */
    from: string | null;
    /** Enclosure */
    to: string | null;
    owner: string | null;
    reason: string | null;
    /** Until when */
    until: string | null;
  }>;
  counts: Array<{
    /** Numbers as in the records folder: one number, or a range that rises or falls */
    fibers: string;
    /** Name of the other numbering */
    name: string;
    /** Numbers as in the records folder: one number, or a range that rises or falls */
    numbers: string;
  }>;
  changed: PostingRef | null;
  /** The last posting that this answer takes in; 0 where the records are empty */
  posting: number;
};

export type CableRow = {
  seq: number;
  /** Structure */
  structure: string;
  kind: StructureKind;
  /** Longitude, degrees, WGS 84 */
  lon: number;
  /** Latitude, degrees, WGS 84 */
  lat: number;
  /** Span travelled to reach it; null on row 0 */
  span: string | null;
  placement: Placement | null;
  /** Route from row 0, metres */
  route_m: number;
  /** Sheath position where it arrives, metres */
  position_in_m: number;
  /** Sheath position where it leaves, metres */
  position_out_m: number;
  position_basis: LengthBasis;
  /** Sheath coiled here, metres */
  slack_m: number;
  slack_trust: Trust;
  /** When the coil was seen */
  slack_on: string | null;
  duct: string | null;
  marks: Array<Mark>;
  /** Enclosure entered */
  enclosure: string | null;
  /** Fibers cut there, e.g. 1-12,25; null where it enters none */
  opened: string | null;
};

export type CableSection = {
  /** From the run's start */
  index: number;
  /** Enclosure; null at a bare end */
  from: string | null;
  /** Enclosure; null at a bare end */
  to: string | null;
  /** Structure */
  from_structure: string;
  /** Structure */
  to_structure: string;
  /** Sheath length, metres */
  sheath_m: number;
  /** Route length, metres */
  route_m: number;
  length_basis: LengthBasis;
  /** Every fiber once, by ranges of fibers alike, rising */
  uses: Array<{
    /** Numbers as in the records folder: one number, or a range that rises or falls */
    fibers: string;
    use: FiberUse;
    /** First circuit by priority, then code */
    circuit: string | null;
    circuits_total: number;
    /** Of a flag */
    owner: string | null;
    /** Of a flag */
    reason: string | null;
    /** Of a reservation */
    until: string | null;
    /** Least recent verification of its joints */
    verified_on: string | null;
  }>;
};

export type CableType = {
  /** Code */
  code: string;
  fibers: number;
  fibers_per_tube: number;
  /** Fiber type */
  fiber_type: string;
  /** Excess length of glass over sheath, per cent */
  overlength_pct: number;
  ribbon: boolean;
  fibers_per_ribbon: number | null;
  /** Colour code */
  colors: string;
};

export type Circuit = {
  /** Code */
  circuit: string;
  service: string | null;
  customer: string | null;
  /** 1 first to be restored ... 5 */
  priority: number;
  customers_served: number;
  /** The first is the default */
  wavelengths_nm: Array<number>;
  /** A class code, or a number of dB */
  budget: string | null;
  protection_group: string | null;
  /** State */
  status: "working" | "planned" | "retired";
  /** Port or ports */
  a: string;
  /** Port or ports */
  z: string;
  a_at: PortPlace;
  z_at: PortPlace;
  /** Other circuits of its protection group */
  partners: Array<string>;
  changed: PostingRef | null;
  /** The last posting that this answer takes in; 0 where the records are empty */
  posting: number;
};

export type CircuitList = {
  /** By code */
  circuits: Array<CircuitSummary>;
  /** Pass as after for the next page; null on the last */
  next: string | null;
  /** Circuits that match */
  total: number;
  /** The last posting that this answer takes in; 0 where the records are empty */
  posting: number;
};

export type CircuitSummary = {
  /** Code */
  circuit: string;
  service: string | null;
  customer: string | null;
  /** 1 first to be restored ... 5 */
  priority: number;
  customers_served: number;
  /** The first is the default */
  wavelengths_nm: Array<number>;
  /** A class code, or a number of dB */
  budget: string | null;
  protection_group: string | null;
  /** State */
  status: "working" | "planned" | "retired";
  /** Port or ports */
  a: string;
  /** Port or ports */
  z: string;
};

export type ConnectorElement = {
  kind: "connector";
  /** Port crossed */
  port: string;
  /** Enclosure */
  enclosure: string;
  /** Structure */
  structure: string;
  /** Kind of connector */
  connector: string;
  trust: Trust | null;
  /** Expected loss, dB */
  loss_db: number;
  /** Limit loss, dB */
  loss_limit_db: number;
  basis: LossBasis;
  /** Who measured the loss and when, or the planning value with its published source */
  source: string;
  /** Glass from the path's start to where this begins, metres */
  glass_from_m: number;
};

export type CutFiber = {
  fiber: number;
  tube: number;
  tube_color: string;
  fiber_color: string;
  /** The working circuits on it, first restored first */
  carries: Array<string>;
  /** Of the first circuit on it */
  priority: number | null;
  /** down or single as the first circuit on it is; else what else its glass is used for */
  state: "down" | "single" | "in_use" | "jumpered" | "reserved" | "leased" | "dead" | "suspect" | "spare_unknown" | "spare" | "spare_verified";
};

export type CutSection = {
  cable: string;
  /** The enclosure toward the cable's start */
  from: string | null;
  /** The enclosure toward the cable's end */
  to: string | null;
  from_structure: string;
  to_structure: string;
  /** Its cut fibers in the order to restore: those of the first circuits first, dark ones last by number */
  fibers: Array<CutFiber>;
};

export type DoubtfulJoint = {
  enclosure: string;
  a: string;
  b: string;
  trust: Trust;
};

export type DraftHeader = {
  /** The job */
  job?: string | null;
  /** The crew */
  spliced_by?: string | null;
  /** Day of the work */
  spliced_on?: string | null;
  /** How it is known: crew's sheet, photo, trace, telephone */
  source?: string | null;
  /** Anything else */
  note?: string | null;
};

export type DraftCursor = {
  /** Line, from 1 */
  line?: number;
  /** Column, from 1 */
  column?: number;
};

export type DraftAnswer = {
  /** The finding's rule */
  rule: string;
  /** Text of the line that it stands in, as typed; blank where it is about the sheet */
  line?: string;
  /** The answer */
  reason: string;
};

export type DraftSummary = {
  /** Number of the draft */
  draft: number;
  /** Its enclosure; null where that is gone from the records */
  enclosure: string | null;
  /** Who writes it */
  author: string;
  /** How far it has come */
  state: "writing" | "submitted" | "posted" | "dropped";
  /** One more at every change */
  revision: number;
  /** Last posting that its author has seen */
  base: number;
  /** When begun */
  begun_at: string;
  /** When last changed */
  saved_at: string;
  /** The job */
  job: string | null;
  /** Who submitted it */
  submitted_by: string | null;
  /** The posting that it became */
  posting: number | null;
};

export type DraftList = {
  /** The drafts */
  drafts: Array<DraftSummary>;
};

export type Draft = {
  /** Number of the draft */
  draft: number;
  /** Its enclosure; null where that is gone from the records */
  enclosure: string | null;
  /** Who writes it */
  author: string;
  /** How far it has come */
  state: "writing" | "submitted" | "posted" | "dropped";
  /** One more at every change */
  revision: number;
  /** Last posting that its author has seen */
  base: number;
  /** When begun */
  begun_at: string;
  /** When last changed */
  saved_at: string;
  /** The job */
  job: string | null;
  /** Who submitted it */
  submitted_by: string | null;
  /** The posting that it became */
  posting: number | null;
  /** The lines as typed */
  lines: Array<string>;
  header: DraftHeader;
  cursor: DraftCursor;
  /** Answers to findings */
  answers: Array<DraftAnswer>;
  /** Whether there is something to undo */
  can_undo: boolean;
  /** Whether there is something to redo */
  can_redo: boolean;
  /** The other open drafts of the same enclosure */
  beside: Array<DraftSummary>;
};

export type DraftRequest = {
  /** Code of the enclosure */
  enclosure: string;
  /** Who writes it */
  author: string;
  /** All lines of the sheet */
  lines?: Array<string>;
  header?: DraftHeader;
  cursor?: DraftCursor;
  /** Answers to findings */
  answers?: Array<DraftAnswer>;
};

export type DraftSaveRequest = {
  /** Revision of the draft upon which this is done */
  revision: number;
  /** Last posting that its author has seen; left out: as before */
  base?: number;
  /** All lines of the sheet */
  lines?: Array<string>;
  header?: DraftHeader;
  cursor?: DraftCursor;
  /** Answers to findings */
  answers?: Array<DraftAnswer>;
};

export type DraftStepRequest = {
  /** Revision of the draft upon which this is done */
  revision: number;
};

export type DraftSubmitRequest = {
  /** Revision of the draft upon which this is done */
  revision: number;
  /** Who submits it */
  by: string;
};

export type DraftPostRequest = {
  /** Revision of the draft upon which this is done */
  revision: number;
  /** Who posts */
  by: string;
  /** Why */
  reason: string;
};

export type DraftCheckRequest = {

};

export type DraftFinding = {
  /** Line, from 1 */
  line: number;
  /** Column, from 1 */
  column: number;
  /** Characters, 0 where something is missing or where it is about the sheet */
  length: number;
  /** error: it cannot be so, mend it. warning: mend it or answer it. prompt: answer it */
  weight: "error" | "warning" | "prompt";
  /** Stable code of the rule */
  rule: string;
  /** What is found */
  text: string;
  /** What would mend it */
  mend: string;
  /** The answer that was given */
  answer: string | null;
};

export type DraftUnderstood = {
  /** Line, from 1 */
  line: number;
  /** Column, from 1 */
  column: number;
  /** Characters, 0 where something is missing or where it is about the sheet */
  length: number;
  /** The ends, in the notation of the records */
  ends: Array<string>;
};

export type DraftCircuit = {
  /** Code */
  circuit: string;
  /** 1 first to be restored */
  priority: number;
  /** Customers */
  customers_served: number;
  /** Its first wavelength, nm */
  wavelength_nm: number;
  /** Whether a path joins its ports now */
  whole_before: boolean;
  /** Whether one would */
  whole_after: boolean;
  /** Greatest expected loss of its paths now, dB; null where not known */
  loss_before_db: number | null;
  /** The same as if posted, dB */
  loss_after_db: number | null;
};

export type DraftCheck = {
  /** Number of the draft */
  draft: number;
  /** Revision that was checked */
  revision: number;
  /** Last posting looked at */
  posting: number;
  /** By their places, prompts last */
  findings: Array<DraftFinding>;
  /** Whether nothing is open, so that it can be submitted */
  ready: boolean;
  /** By line */
  understood: Array<DraftUnderstood>;
  /** What the enclosure holds, as lines */
  before: Array<string>;
  /** What it would hold */
  after: Array<string>;
  /** How many records would change */
  changes: number;
  /** The first circuits touched, in the order to restore */
  circuits: Array<DraftCircuit>;
  /** How many are touched */
  circuits_total: number;
  /** Whether the author may not post it: a circuit of priority 1 or 2 is touched */
  second_person: boolean;
};

export type DraftConflict = {
  /** Line, from 1 */
  line: number;
  /** Column, from 1 */
  column: number;
  /** Characters, 0 where something is missing or where it is about the sheet */
  length: number;
  /** The leg, or the splitter's or panel's side */
  leg: string;
  /** The tube; blank where there is none */
  tube: string;
  /** The fibers, outputs or ports */
  numbers: string;
  /** What the first of them was when the author looked */
  was: string;
  /** What it is now */
  is: string;
  /** What the sheet says */
  said: string;
};

export type DraftPasteRequest = {
  /** Rows parted by line breaks, cells by tabs, else by commas; with a header or without */
  text: string;
};

export type DraftCellDoubt = {
  /** Row of the block, from 1 */
  row: number;
  /** Cell of the row, from 1 */
  column: number;
  /** What stands in it */
  text: string;
  /** What would be right */
  mend: string;
};

export type DraftPaste = {
  /** The lines, rows that carry on one another as ranges */
  lines: Array<string>;
  /** Every cell that is not understood */
  doubts: Array<DraftCellDoubt>;
};

export type Element = ConnectorElement | SpliceElement | FiberElement | ThroughElement | JumperElement | SplitterElement;

export type Enclosure = {
  /** Code */
  code: string;
  kind: EnclosureKind;
  /** Structure that it is at */
  structure: string;
  structure_kind: StructureKind;
  /** Longitude, degrees, WGS 84 */
  lon: number;
  /** Latitude, degrees, WGS 84 */
  lat: number;
  state: PlantState;
  note: string | null;
  /** Glass between the sheath and a joint, on each side of it, metres */
  tray_glass_m: number;
  /** By cable, back before ahead */
  legs: Array<Leg>;
  /** Everything joined here, planned joints of the job asked for among them; by tray, then as recorded */
  joints: Array<Joint>;
  panels: Array<{
    /** Code */
    panel: string;
    /** Connector */
    connector: string;
    ports: Array<Port>;
  }>;
  splitters: Array<{
    /** Code */
    splitter: string;
    inputs: number;
    outputs: number;
    terminals: Array<{
      /** in, in 2, out 1 ... */
      terminal: string;
      /** The end or port that it is joined to */
      joined_to: string | null;
      /** Index into joints */
      joint: number | null;
      /** From the input to this output, dB */
      loss_db: number | null;
      loss_basis: LossBasis;
      circuits_total: number;
    }>;
    /** Source of its loss */
    source: string;
  }>;
  changed: PostingRef | null;
  /** The last posting that this answer takes in; 0 where the records are empty */
  posting: number;
};

export type EnclosureKind = "closure" | "terminal" | "cabinet" | "frame";

export type EndRange = {
  /** In the notation of the records: F-1 ahead 1-12, S1 out 5, or a port E1/P/1-12 */
  text: string;
  /** What kind of end */
  kind: "leg" | "splitter_in" | "splitter_out" | "port_rear" | "port_front";
  /** Code of the cable, splitter, or panel */
  of: string;
  /** Enclosure that it is in */
  enclosure: string;
  /** Side of a leg */
  side: "back" | "ahead" | null;
  /** Numbers as in the records folder: one number, or a range that rises or falls */
  numbers: string;
};

export type Fault = {
  /** Index of the change in the request, from 0 */
  change: number;
  /** Column that is wrong, or null where the fault is the whole row's */
  column: string | null;
  /** What is wrong and what would be right */
  text: string;
};

export type FaultAnswer = {
  /** The wavelength of the shot */
  wavelength_nm: number;
  /** The last posting that this answer takes in; 0 where the records are empty */
  posting: number;
  /** One place; behind a splitter one an output that leads somewhere */
  places: Array<FaultPlace>;
  /** What lies between the places of the near and the far shot; given with far_port */
  between?: {
    /** Glass between by the records; below 0 where the shots overlap */
    glass_m: number;
    /** Sheath between; below 0 where the shots overlap */
    sheath_m: number;
    /** How far that sheath may be off either way */
    within_m: number;
    /** Whether no more lies between than two cursors may stand apart; else take it as damaged, or as two breaks */
    one_break: boolean;
    from: FaultPlace;
    to: FaultPlace;
  };
};

export type FaultPlace = {
  /** Longitude, degrees */
  lon: number;
  /** Latitude, degrees */
  lat: number;
  /** The structure before the place as seen from the port, or the one at which it is */
  structure_before: string;
  /** The structure after it, or the one at which it is */
  structure_after: string;
  /** Sheath from where it leaves the structure before; in a coil from where it arrives */
  beyond_before_m: number;
  /** Sheath to where it comes to the structure after; in a coil to where it leaves */
  short_of_after_m: number;
  /** The span; null at a structure */
  span: string | null;
  /** The cable; null in a jumper */
  cable: string | null;
  /** The fiber; null in a jumper */
  fiber: number | null;
  /** Along the sheath from the start of the cable's run; null in a jumper */
  sheath_position_m: number | null;
  /** The mark to look for; null where the cable has fewer than two ties */
  mark: null | {
    /** The number printed, to a thousandth */
    value: number;
    /** Its unit */
    unit: "m" | "ft";
    /** The governing ink */
    ink: string;
  };
  /** The structure in whose coil it lies */
  in_slack_at: string | null;
  /** A structure whose coil the window touches, the nearest of several; not given where the place lies in a coil */
  may_be_in_slack_at?: string;
  /** On a span; in a coil; in tray glass or at a joint; in a jumper; at a structure without a coil */
  lies_in: "span" | "slack" | "tray" | "jumper" | "structure";
  /** Glass from the port, the launch fiber not counted, as known events stretch it */
  glass_m: number;
  /** Twice the root of the summed squares of within: the true place lies this far either side, in about 95 of 100 */
  within_m: number;
  /** One standard uncertainty a cause, m along the sheath; see docs/FAULT-PLACE.md */
  within: {
    /** Cursor and pulse, of the break and of the events used */
    cursor: number;
    /** The glass's group index; 0 between two known points */
    index: number;
    /** Glass in a length of sheath */
    ratio: number;
    /** Reading of marks; lengths of route in the place of marks */
    marks: number;
    /** Coils on the way from the nearest known point, and beside the place */
    coils: number;
    /** Where the structures are on the map */
    map: number;
  };
  /** The stretch of route within, from the port's side on: its two ends and the bends between; one position where it stays at a structure */
  window: Array<Position>;
  /** Whether the reading lies beyond the path's end; the place is then that end */
  past_end: boolean;
  /** Glass read beyond the path's end; given with past_end */
  over_m?: number;
  /** Where the path ends, e.g. E9/P/4; null for a circle */
  path_end: string | null;
};

export type FiberElement = {
  kind: "fiber";
  /** Cable */
  cable: string;
  fiber: number;
  tube: number;
  /** In words */
  tube_color: string;
  /** In words */
  fiber_color: string;
  /** Enclosure */
  from: string | null;
  /** Enclosure */
  to: string | null;
  /** Structure */
  from_structure: string;
  /** Structure */
  to_structure: string;
  /** Which way the walk goes along the cable's run */
  toward: "ahead" | "back";
  /** Sheath, metres */
  sheath_m: number;
  /** Glass, tray glass in, metres */
  glass_m: number;
  /** Route, metres */
  route_m: number;
  length_basis: LengthBasis;
  /** Marks and their reading, or how else the length is known */
  length_source: string;
  flags: Array<"dead" | "suspect" | "leased" | "reserved">;
  /** Longer cable */
  part_of: string | null;
  /** The fiber in another numbering, e.g. FDR 97 */
  count_name: string | null;
  /** Expected loss, dB */
  loss_db: number;
  /** Limit loss, dB */
  loss_limit_db: number;
  basis: LossBasis;
  /** Who measured the loss and when, or the planning value with its published source */
  source: string;
  /** Glass from the path's start to where this begins, metres */
  glass_from_m: number;
};

export type FiberUse = "in_use" | "jumpered" | "reserved" | "leased" | "dead" | "suspect" | "spare_unknown" | "spare" | "spare_verified";

export type FindAnswer = {
  /** The question as it was understood, trimmed */
  query: string;
  /** Best first */
  results: Array<FindResult>;
  /** True where more would match than limit lets through */
  more: boolean;
};

export type FindResult = {
  /** What it is */
  kind: "structure" | "span" | "enclosure" | "cable" | "fiber" | "port" | "panel" | "splitter" | "circuit" | "customer" | "address" | "place" | "mark" | "coordinate";
  /** What to read first: the code, the name, or the mark */
  label: string;
  /** What it is, in words */
  what: string;
  /** Where it is, in words */
  where: string;
  target: FindTarget;
  /** Longitude, degrees, WGS 84 */
  lon: number | null;
  /** Latitude, degrees, WGS 84 */
  lat: number | null;
};

export type FindTarget = {
  /** Which view opens */
  view: "structure" | "span" | "enclosure" | "cable" | "fiber" | "port" | "circuit" | "map";
  /** What it opens on, in the notation of the records (FDR-S, FDR-S:25, E1/P/1); null for the map */
  code: string | null;
};

export type Health = {
  status: "ok";
};

export type HitCircuit = {
  circuit: string;
  /** down, or single: up while another of its protection group has a whole path */
  state: "down" | "single";
  priority: number;
  customers_served: number;
  /** Where the cut meets the path, in the path's order: F-1:3 for glass, else the enclosure */
  at: Array<string>;
  service: string | null;
  customer: string | null;
  protection_group: string | null;
  /** Whether the records join all its ports; where not, only what they hold of its path was looked at */
  whole: boolean;
};

export type ImpactAnswer = {
  /** The working circuits whose path the cut hits, in the order to restore them */
  circuits: Array<HitCircuit>;
  /** The fibers of the cut cables, lit or dark, each once */
  fibers_cut: number;
  /** Customers of the circuits that are down, of a protection group the most */
  customers_down: number;
  /** The last posting that the answer takes in */
  posting: number;
  /** The cut sections, by cable and along it; only with fibers=yes */
  sheath?: Array<CutSection>;
};

export type Joint = {
  /** Kind of joint */
  kind: "splice" | "termination" | "jumper";
  a: EndRange;
  b: EndRange;
  /** Pairs of ends joined */
  count: number;
  /** Tray */
  tray: string | null;
  /** How */
  method: "fusion" | "mechanical" | "pigtail" | "direct" | null;
  /** Measured loss, two-way mean, of each; null where not measured, dB */
  loss_db: number | null;
  /** What each is reckoned at, dB */
  loss_expected_db: number;
  basis: LossBasis;
  /** Who measured it and when, or the planning value with its published source */
  source: string;
  trust: Trust;
  /** When last verified */
  verified_on: string | null;
  /** When made */
  spliced_on: string | null;
  /** Who made it */
  spliced_by: string | null;
  /** Until when it may stay */
  temporary_until: string | null;
  /** Job */
  job: string | null;
  /** Length of a jumper, metres */
  length_m: number | null;
  /** Circuits through it, the first 20 by priority, then code */
  circuits: Array<string>;
  circuits_total: number;
  changed: PostingRef | null;
};

export type Incident = {
  /** Its number */
  incident: number;
  /** What it is called */
  title: string;
  /** Whether it is open */
  open: boolean;
  /** Who opened it */
  by: string;
  /** When service was lost */
  began_at: string;
  /** When it was entered */
  opened_at: string;
  /** The last posting when it was opened: ask with as_of this number for the records as they stood */
  posting: number;
  from: {
    /** What is believed cut */
    cuts: Array<string>;
    /** Circuits whose path is down from the beginning */
    down: Array<string>;
    /** Circuits known to be up */
    up: Array<string>;
    /** A reading as it was told */
    reading: string | null;
  };
  clock: {
    /** When service was lost */
    began: string;
    /** When somebody was told */
    called: string | null;
    /** When a crew was there */
    on_site: string | null;
    /** When the damage was found */
    found: string | null;
    /** When the first circuit had light again */
    first_light: string | null;
    /** Since when nothing is down any more */
    all_light: string | null;
    /** When it was closed */
    closed: string | null;
  };
  /** Every entry, in the order written */
  log: Array<IncidentEntry>;
  /** When it was counted */
  counted_at: string;
  counts: {
    /** Circuits whose path is down */
    circuits_down: Array<string>;
    /** Circuits that were down and are back */
    circuits_back: Array<string>;
    /** Customers of services that are down */
    customers_down: number;
    /** Circuits of priority 1 whose service is down */
    first_priority_down: Array<string>;
    /** Minutes that at least one service was down */
    outage_minutes: number;
    /** Minutes of circuits whose path is down */
    circuit_minutes: number;
    /** Minutes of customers of services that are down */
    customer_minutes: number;
    /** Minutes of users stated in the log; null where none are stated */
    stated_user_minutes: number | null;
    /** OC3-minutes of capacity stated in the log; null where none is stated */
    oc3_minutes: number | null;
    /** Protection groups that run, or ran, on a single path */
    single_path: Array<{
      /** The group */
      protection_group: string;
      /** For how many days in all */
      days: number;
      /** Whether it does now */
      now: boolean;
    }>;
    /** How it stood whenever something changed */
    over_time: Array<{
      /** From when */
      from: string;
      /** Circuits whose path was down */
      circuits_down: number;
      /** Customers of services that were down */
      customers_down: number;
      /** Protection groups on a single path */
      single_path: Array<string>;
    }>;
  };
  /** How far each count is from its threshold */
  thresholds: Array<ThresholdStanding>;
  /** When each paper would be due, if the outage is one to report */
  papers: Array<PaperDue>;
  decision: "a person decides";
};

export type IncidentCloseRequest = {
  /** When, with its offset */
  at: string;
  by: string;
  text?: string | null;
};

export type IncidentEntry = {
  /** In the order written */
  number: number;
  kind: "called" | "on_site" | "found" | "first_light" | "all_light" | "circuits_down" | "circuits_back" | "stated" | "note" | "reading" | "closed" | "reopened";
  /** When it happened */
  at: string;
  /** When it was written */
  written_at: string;
  /** Who wrote */
  by: string;
  /** In words */
  text: string | null;
  /** The circuits that it names */
  circuits: Array<string>;
  /** Users that it states to be down */
  users: number | null;
  /** OC3 equivalents that it states to be down */
  oc3: number | null;
  /** The entry in whose place it stands */
  corrects: number | null;
  /** The entry that stands in its place; then it counts no longer */
  corrected_by: number | null;
};

export type IncidentEntryRequest = {
  kind: "called" | "on_site" | "found" | "first_light" | "all_light" | "circuits_down" | "circuits_back" | "stated" | "note" | "reading" | "closed" | "reopened";
  /** When it happened, with its offset */
  at: string;
  by: string;
  text?: string | null;
  /** For circuits_down and circuits_back */
  circuits?: Array<string>;
  /** For stated: users down from then on */
  users?: number | null;
  /** For stated: OC3 equivalents down from then on */
  oc3?: number | null;
  /** The entry in whose place it stands */
  corrects?: number | null;
};

export type IncidentList = {
  /** Open first, then the last begun first */
  incidents: Array<IncidentSummary>;
};

export type IncidentRequest = {
  title: string;
  by: string;
  /** When service was lost, with its offset */
  began_at: string;
  /** span:, structure:, cable:, enclosure:, tube: or place: before a code */
  cuts?: Array<string>;
  /** Circuits that are down; left out or empty: all working ones that cuts take down by the records */
  down?: Array<string>;
  up?: Array<string>;
  reading?: string | null;
};

export type IncidentSummary = {
  /** Its number */
  incident: number;
  /** What it is called */
  title: string;
  /** Whether it is open */
  open: boolean;
  /** Who opened it */
  by: string;
  /** When service was lost */
  began_at: string;
  /** When it was entered */
  opened_at: string;
  /** The last posting when it was opened: ask with as_of this number for the records as they stood */
  posting: number;
  /** When it was closed */
  closed_at: string | null;
  /** Circuits whose path is down */
  circuits_down: number;
  /** Customers of services that are down */
  customers_down: number;
};

export type PaperDue = any;

export type ReportingThreshold = {
  /** The setting of the records that replaces it */
  setting: string;
  /** What it is about */
  title: string;
  /** The figure */
  limit: number;
  /** What it counts */
  unit: string;
  /** Where the figure is from */
  source: string;
  /** READ-P stated by the primary text, READ-S by a secondary page, MEM from memory, COMP reckoned; null where the records set it */
  source_status: string | null;
  /** Why the records' own setting is not used */
  note: string | null;
};

export type Repair = {
  /** Whether nothing was kept */
  preview: boolean;
  /** Its posting; null for a preview */
  posting: number | null;
  /** The part toward the start, the piece, the part toward the end */
  parts: Array<string>;
  /** The longer cable that they are part of */
  part_of: string;
  /** How many are joined at each end of the piece */
  fibers: number;
  /** How many joints it makes */
  joints: number;
  /** How many records it adds, changes and removes */
  changes: number;
  /** Sheath of the piece */
  piece_m: number;
  /** The route that it takes */
  route_m: number;
  /** Sheath that was coiled along that route, and is there no longer */
  coils_removed_m: number;
  joined: Array<{
    /** Where */
    enclosure: string;
    /** Its structure */
    structure: string;
    /** Ends on one side */
    a: string;
    /** Ends on the other, joined in order */
    b: string;
    /** How many joints */
    count: number;
    /** The cut cable's coil there before */
    slack_before_m: number;
    /** What is left of it */
    slack_after_m: number;
  }>;
  /** Working circuits whose glass the cut goes through, in the order to restore */
  circuits: Array<string>;
  /** Measurements of glass that is there no longer, as they were written */
  left_in_journal: Array<string>;
};

export type RepairRequest = {
  /** The reel that was cut */
  cable: string;
  /** Sheath position of the cut, from the cable's start; this or span */
  at_m?: number;
  /** The span on which it was cut; where the cable lies on it twice, the first time */
  span?: string;
  by: string;
  reason: string;
  /** Toward the cable's start, then toward its end */
  enclosures: Array<{
    /** One that is there, or the code of a new closure */
    enclosure: string;
    /** Where it is: a structure that the cable visits */
    structure: string;
    /** Tray glass of a new one; 0 where it is not said */
    tray_glass_m?: number;
  }>;
  piece?: {
    /** Its code; else the next that goes on from the old one */
    cable?: string | null;
    /** Its type, of as many fibers at least; else the cut cable's */
    cable_type?: string | null;
    /** Its reel */
    reel?: string | null;
    /** Its sheath; else as long as the route. What is over is coiled at the second structure */
    length_m?: number;
  };
  /** Coils of the cut cable that were drawn from, at the two structures */
  slack?: Array<{
    /** Where it is coiled */
    structure: string;
    /** What is still coiled */
    left_m: number;
  }>;
  method?: "fusion" | "mechanical";
  /** Who made the joints */
  spliced_by?: string | null;
  /** When they were made */
  spliced_on?: string | null;
  /** Their last day, where they are temporary */
  temporary_until?: string | null;
  /** The job */
  job?: string | null;
  /** The same as preview=yes */
  preview?: boolean;
};

export type TemporaryList = {
  /** The day from which days are counted, in the records' own zone */
  today: string;
  /** The one longest past its day first; each is listed until it is undone */
  temporary: Array<{
    changed: PostingRef | null;
    /** Where it is */
    enclosure: string;
    /** Ends on one side */
    a: string;
    /** Ends on the other */
    b: string;
    /** How many joints */
    count: number;
    /** fusion or mechanical; null for a jumper or a direct termination */
    method: string | null;
    /** Its last day */
    until: string;
    /** Days until then; below 0 where it is past */
    days_left: number;
    /** Whether that day is past */
    lapsed: boolean;
    /** The job it belongs to */
    job: string | null;
    /** When it was made */
    spliced_on: string | null;
    /** Who made it */
    spliced_by: string | null;
  }>;
};

export type ThresholdStanding = any;

export type JumperElement = {
  kind: "jumper";
  /** Port */
  a: string;
  /** Port */
  b: string;
  /** Structure */
  structure: string;
  /** Glass, metres */
  glass_m: number;
  /** Expected loss, dB */
  loss_db: number;
  /** Limit loss, dB */
  loss_limit_db: number;
  basis: LossBasis;
  /** Who measured the loss and when, or the planning value with its published source */
  source: string;
  /** Glass from the path's start to where this begins, metres */
  glass_from_m: number;
};

export type Leg = {
  /** Cable */
  cable: string;
  /** Toward the run's start or its end */
  side: "back" | "ahead";
  /** Run row of the cable here */
  seq: number;
  /** Cable type */
  cable_type: string;
  fibers: number;
  fibers_per_tube: number;
  ribbon: boolean;
  /** Colour of each tube or ribbon, in words, first tube first */
  tube_colors: Array<string>;
  /** Colour of each place in a tube, in words */
  fiber_colors: Array<string>;
  /** The next structure along the run */
  to_structure: string | null;
  /** The next enclosure along the run that the cable enters */
  to_enclosure: string | null;
  /** True bearing in which it leaves, degrees from north */
  bearing_deg: number | null;
  /** Sheath position of this enclosure, metres */
  sheath_position_m: number;
  /** Sheath to the next enclosure, metres */
  sheath_m: number | null;
  /** Glass of a fiber cut at both, to the next enclosure, tray glass in, metres */
  glass_m: number | null;
  length_basis: LengthBasis;
  mark: {
    /** Printed mark where the sheath enters, in unit */
    value: number;
    /** Unit */
    unit: "m" | "ft";
    /** Ink */
    ink: string;
    /** When it was read */
    read_on: string | null;
  } | null;
  /** Every fiber of the leg, by ranges, rising; unrecorded: the tube is not opened and nothing is recorded, so it goes through */
  ends: Array<{
    /** Numbers as in the records folder: one number, or a range that rises or falls */
    fibers: string;
    /** State of the ends */
    state: "spliced" | "terminated" | "through" | "capped" | "stored" | "unknown" | "unrecorded";
    trust: Trust | null;
    /** When it was last verified */
    verified_on: string | null;
    use: FiberUse;
    /** Index into joints */
    joint: number | null;
  }>;
};

export type LengthBasis = "marks" | "nominal" | "measured" | "geodesic" | "recorded" | "unknown";

export type LightAnswer = {
  /** The last posting taken in */
  posting: number;
  /** By priority, then more customers first, then code */
  groups: Array<LightGroup>;
  /** Circuits that nothing named hits by the records, or whose ports no path joins */
  strays: Array<string>;
  /** Spare glass shared out: at most one offer a group, no fiber used twice */
  assigned: Array<{
    /** Index in groups */
    group: number;
    offer: LightOffer;
  }>;
  /** Groups for which nothing is left, as indexes in groups */
  unserved: Array<number>;
  /** Whether no other sharing out of the offers found serves more; else the search for one was cut short */
  proven: boolean;
};

export type LightGroup = {
  /** Codes, by priority, then more customers first, then code */
  circuits: Array<string>;
  /** The best of their priorities */
  priority: number;
  /** Customers on all of them */
  customers: number;
  /** Glass paths to light */
  fibers: number;
  /** Temporary paths, least work first, then least loss */
  offers: Array<LightOffer>;
  /** What is not offered, and why not */
  refused: Array<LightRefused>;
};

export type LightJoint = {
  /** What joins */
  kind: "splice" | "termination" | "jumper";
  /** Where; of a jumper, that of its a side */
  enclosure: string;
  /** One end, e.g. F-1 back 3, or a port */
  a: string;
  /** The other end */
  b: string;
};

export type LightOffer = {
  work: LightWork;
  /** Structures where hands work, by code */
  structures: Array<string>;
  /** Spans that the path lies on, from one end on, of the fibers one after another, each once */
  spans: Array<string>;
  /** For each glass path its fibers in order, e.g. F-1:3 */
  fibers: Array<Array<string>>;
  /** Joints to make, in order */
  joints: Array<LightJoint>;
  /** Glass of the longest path, m */
  glass_m: number;
  /** What the worst of the circuits would lose, dB, traced as if the joints were posted; null where a value is missing */
  loss_db: number | null;
  /** The circuit that has least left of its budget; where none has one, that loses most */
  worst: string;
  /** Its budget, dB; null where it has none */
  budget_db: number | null;
  /** What is left of its budget beside margin_db; null where it has none */
  left_db: number | null;
  /** Why the loss is not known, as sentences; empty where it is */
  unknown: Array<string>;
  /** Circuits whose ends move to other ports */
  moves: Array<{
    /** Code */
    circuit: string;
    /** Ports at one end */
    a: string;
    /** Ports at the other end */
    z: string;
  }>;
  /** What to send to POST /postings to keep it in the records */
  changes: Array<RowChange>;
  /** What to send to POST /postings after the repair: the records are as before */
  undo: Array<RowChange>;
};

export type LightRefused = {
  /** The reason */
  why: "over_budget" | "suspect" | "partner" | "unverified" | "no_spare_glass" | "not_down_by_records";
  /** The reason for a person */
  text: string;
  work?: LightWork;
  /** Structures where hands work, by code */
  structures?: Array<string>;
  /** Spans that the path lies on, from one end on, of the fibers one after another, each once */
  spans?: Array<string>;
  /** For each glass path its fibers in order, e.g. F-1:3 */
  fibers?: Array<Array<string>>;
  /** Joints to make, in order */
  joints?: Array<LightJoint>;
  /** Glass of the longest path, m */
  glass_m?: number;
  /** What the worst of the circuits would lose, dB, traced as if the joints were posted; null where a value is missing */
  loss_db?: number | null;
  /** The circuit that has least left of its budget; where none has one, that loses most */
  worst?: string;
  /** Its budget, dB; null where it has none */
  budget_db?: number | null;
  /** What is left of its budget beside margin_db; null where it has none */
  left_db?: number | null;
  /** Why the loss is not known, as sentences; empty where it is */
  unknown?: Array<string>;
};

export type LightRequest = {
  /** Codes of circuits that are down; left out or empty: all working ones that cuts and avoid take down */
  down?: Array<string>;
  /** What is cut, as in GET /impact, e.g. span:S-1 */
  cuts?: Array<string>;
  /** What else to keep away from, such as suspects, in the same notation */
  avoid?: Array<string>;
  /** Panels whose free ports may feed splitters in the place of their own, e.g. HUT-S/OLT; equipment is not in the records */
  from_panels?: Array<string>;
  /** Whether spare glass must be verified */
  verified_only?: boolean;
  /** Kept free of each budget, dB */
  margin_db?: number;
  /** Most offers a group */
  offers?: number;
  /** Last day of the temporary joints, in changes as temporary_until; null or left out: none */
  until?: string | null;
};

export type LightWork = {
  /** Structures where hands work */
  visits: number;
  /** Closed tubes that must be opened */
  tubes_opened: number;
  /** New splices, pigtails among them */
  new_splices: number;
  /** Jumpers laid and plugs moved */
  patches: number;
  /** Joints crossed as they are that nobody has verified */
  unverified: number;
};

export type Line = Array<Position>;

export type LossBasis = "measured" | "planning" | "type" | "sheet" | "none";

export type Mark = {
  /** Which set of marks */
  ink: string;
  /** Unit of the marks */
  unit: "m" | "ft";
  /** Mark where the sheath arrives, in unit */
  mark_in: number | null;
  /** Mark where the sheath leaves, in unit */
  mark_out: number | null;
  /** When it was read */
  read_on: string | null;
  trust: Trust;
  /** True where this set ties the sheath's position */
  governs: boolean;
};

export type Path = {
  /** True where both ends are fronts; for a circuit, its a and its z */
  complete: boolean;
  /** Circuit whose ports the two ends are */
  circuit: string | null;
  /** All such circuits */
  circuits: Array<string>;
  wavelength_nm: number;
  /** True for a circle */
  loop: boolean;
  /** Two, or none for a circle */
  ends: Array<string>;
  /** In the order in which the walk meets them */
  elements: Array<Element>;
  totals: {
    /** Cables alone, metres */
    sheath_m: number;
    /** With jumpers, metres */
    glass_m: number;
    /** Route walked, metres */
    route_m: number;
    splices: number;
    connectors: number;
    splitters: number;
    /** Expected, dB */
    loss_db: number;
    /** Limit, dB */
    loss_limit_db: number;
    /** Expected plus three standard deviations, at most the limit, dB */
    loss_statistical_db: number;
    /** Chromatic dispersion; null where the fiber type gives none */
    dispersion_ps_per_nm: number | null;
    /** Polarization mode dispersion; null where not given */
    pmd_ps: number | null;
    /** Splices, connectors and splitters reckoned at planning values */
    unmeasured: number;
    /** Joints whose trust is not verified */
    unverified: number;
  };
  budget: Budget | null;
  /** Points [glass_m, sheath_m, route_m, lon, lat] from the path's start on, linear between: every bend of the route, both sides of every coil, tray glass and jumper; each rises or stays */
  track: Array<Array<number>>;
  /** Structures passed, in order, once each time */
  stations: Array<{
    /** Structure */
    structure: string;
    kind: StructureKind;
    /** Enclosure that the glass enters here; null where it only passes the structure */
    enclosure: string | null;
    /** Glass from the path's start; the middle of the coil where there is one, metres */
    glass_m: number;
    /** Sheath from the start, metres */
    sheath_m: number;
    /** Route from the start, metres */
    route_m: number;
    /** Longitude, degrees, WGS 84 */
    lon: number;
    /** Latitude, degrees, WGS 84 */
    lat: number;
    /** Sheath coiled here, metres */
    coil_m: number;
  }>;
};

export type Placement = "aerial" | "duct" | "buried" | "indoor" | "underwater";

export type PlantMap = {
  type: "FeatureCollection";
  /** The last posting that this answer takes in; 0 where the records are empty */
  posting: number;
  /** True where structures were left out because of the zoom or because there are too many; spans are never left out for the zoom, but their bends may be */
  truncated: boolean;
  /** Spans first, then structures */
  features: Array<PlantStructure | PlantSpan>;
};

export type PlantSpan = {
  type: "Feature";
  geometry: {
    type: "LineString";
    coordinates: Line;
  };
  properties: {
    record: "span";
    /** Code of the span */
    code: string;
    /** Structure where its line begins */
    from: string;
    /** Structure where its line ends */
    to: string;
    placement: Placement;
    state: PlantState;
    /** Fibers of the in-service cables on it */
    fibers: number;
    /** Cables on it */
    cables: number;
  };
};

export type PlantState = "in service" | "planned" | "abandoned";

export type PlantStructure = {
  type: "Feature";
  geometry: {
    type: "Point";
    coordinates: Position;
  };
  properties: {
    record: "structure";
    /** Code of the structure */
    code: string;
    kind: StructureKind;
    state: PlantState;
    /** Enclosures at it */
    enclosures: number;
    /** Fibers of the in-service cables that visit it */
    fibers: number;
  };
};

export type Port = {
  /** Number */
  port: number;
  /** The end that its rear is joined to; null where none is */
  rear: string | null;
  rear_trust: Trust | null;
  /** Index into joints */
  rear_joint: number | null;
  /** What is on its front */
  front: "free" | "jumper" | "circuits";
  /** Port at the jumper's other end */
  jumper_to: string | null;
  /** The first 20 */
  circuits: Array<string>;
  circuits_total: number;
};

export type PortPlace = {
  /** Port */
  port: string;
  /** Enclosure */
  enclosure: string;
  /** Structure */
  structure: string;
  /** Longitude, degrees, WGS 84 */
  lon: number;
  /** Latitude, degrees, WGS 84 */
  lat: number;
};

export type Position = Array<number>;

export type Posting = {
  posting: number;
  /** When */
  time: string;
  /** Who */
  by: string;
  /** Why */
  reason: string;
  changes_total: number;
  /** Pass as from_change for the next page of changes; null on the last */
  next_change: number | null;
  changes: Array<{
    /** Index, from 0 */
    change: number;
    /** What was done */
    action: "add" | "change" | "remove";
    /** Table of the records folder, without .csv */
    table: "settings" | "structures" | "spans" | "fiber_types" | "cable_types" | "color_codes" | "cables" | "cable_values" | "cable_runs" | "sheath_marks" | "enclosures" | "enclosure_cables" | "splitters" | "splitter_outputs" | "splices" | "panels" | "terminations" | "end_states" | "jumpers" | "measurements" | "fiber_flags" | "counts" | "circuits" | "planning_values" | "basemap";
    /** What it is about, in the notation of the records */
    code: string | null;
    /** The row before, by column */
    before: Record<string, string | number | null> | null;
    /** The row after, by column */
    after: Record<string, string | number | null> | null;
  }>;
};

export type PostingList = {
  /** Latest first */
  postings: Array<PostingSummary>;
  /** Pass as before for the next page; null on the last */
  next: number | null;
};

export type PostingRef = {
  /** Number of the posting */
  posting: number;
  /** When it was posted */
  time: string;
  /** Who posted it */
  by: string;
  /** Why */
  reason: string;
};

export type PostingRequest = {
  /** Who posts it */
  by: string;
  /** Why */
  reason: string;
  /** The posting that the changes rest on, such as that of an answer: refused where a later one came meanwhile; null for any */
  unchanged_since?: number | null;
  changes: Array<RowChange>;
};

export type UndoRequest = {
  /** Who posts it */
  by: string;
  /** Why */
  reason: string;
};

export type PostingSummary = {
  posting: number;
  /** When */
  time: string;
  /** Who */
  by: string;
  /** Why */
  reason: string;
  /** How many changes */
  changes: number;
};

export type Problem = {
  /** A URI reference for the kind of problem */
  type: string;
  /** The kind of problem in a few words */
  title: string;
  /** HTTP status */
  status: number;
  /** What is wrong and what would be right */
  detail: string;
  /** Stable name of the problem. wavelength_out_of_range: a fiber on the path has no value there. forbidden: not from this machine, or from another site's page. unavailable: it took too long, or the server is at its bounds */
  code: "not_found" | "bad_request" | "bad_reference" | "wavelength_out_of_range" | "refused" | "too_large" | "unsupported_media_type" | "method_not_allowed" | "forbidden" | "unavailable" | "stale_revision" | "plant_changed" | "internal";
  /** The request that it answers */
  instance?: string;
  /** The query parameter that is wrong, where there is one */
  parameter?: string;
  /** For a refused posting: every fault, not only the first */
  faults?: Array<Fault>;
  /** Of a stale revision: the draft as it is now */
  theirs?: Draft;
  /** Of a stale revision: the lines that were sent */
  yours?: Array<string>;
  /** Where the plant was changed meanwhile, a tube each */
  conflicts?: Array<DraftConflict>;
};

export type RowChange = {
  /** What to do */
  action: "add" | "change" | "remove";
  /** Table of the records folder, without .csv */
  table: "settings" | "structures" | "spans" | "fiber_types" | "cable_types" | "color_codes" | "cables" | "cable_values" | "cable_runs" | "sheath_marks" | "enclosures" | "enclosure_cables" | "splitters" | "splitter_outputs" | "splices" | "panels" | "terminations" | "end_states" | "jumpers" | "measurements" | "fiber_flags" | "counts" | "circuits" | "planning_values";
  /** Columns as in the records folder; for change, those that change; for remove, may be left out */
  row?: Record<string, string | number | null>;
  /** Natural key of the row to change or remove, by column */
  key?: Record<string, string | number | null>;
};

export type RunRowHere = {
  /** Cable */
  cable: string;
  /** Row of its run */
  seq: number;
  /** Enclosure that the cable enters here; null where it passes all unseen */
  enclosure: string | null;
  /** Sheath position where it arrives, metres */
  position_in_m: number;
  /** Sheath position where it leaves, metres */
  position_out_m: number;
  /** Sheath coiled here, metres */
  slack_m: number;
  slack_trust: Trust;
  /** When the coil was seen */
  slack_on: string | null;
  marks: Array<Mark>;
};

export type Span = {
  /** Code */
  code: string;
  /** Structure */
  from: string;
  /** Structure */
  to: string;
  placement: Placement;
  state: PlantState;
  /** Route length, metres */
  length_m: number;
  length_basis: LengthBasis;
  line: Line | null;
  shared_risk: Array<string>;
  note: string | null;
  cables: Array<{
    /** Cable */
    cable: string;
    /** Run row that this span leads to */
    seq: number;
    /** Duct */
    duct: string | null;
    fibers: number;
    /** Sheath between the two structures, metres */
    sheath_m: number;
    sheath_basis: LengthBasis;
    uses: UseCounts;
    state: PlantState;
  }>;
  /** Working circuits whose path lies on it */
  circuits: number;
  changed: PostingRef | null;
  /** The last posting that this answer takes in; 0 where the records are empty */
  posting: number;
};

export type SpliceElement = {
  kind: "splice";
  /** Enclosure */
  enclosure: string;
  /** Structure */
  structure: string;
  tray: string | null;
  /** How */
  method: "fusion" | "mechanical";
  /** End that the walk comes from */
  a: string;
  /** End that the walk goes to */
  b: string;
  trust: Trust;
  /** When last verified */
  verified_on: string | null;
  /** When made */
  spliced_on: string | null;
  spliced_by: string | null;
  /** Until when */
  temporary_until: string | null;
  job: string | null;
  /** True for the splice of a pigtail */
  pigtail: boolean;
  /** Expected loss, dB */
  loss_db: number;
  /** Limit loss, dB */
  loss_limit_db: number;
  basis: LossBasis;
  /** Who measured the loss and when, or the planning value with its published source */
  source: string;
  /** Glass from the path's start to where this begins, metres */
  glass_from_m: number;
};

export type SplitterElement = {
  kind: "splitter";
  /** Enclosure */
  enclosure: string;
  /** Structure */
  structure: string;
  /** Splitter */
  splitter: string;
  inputs: number;
  input: number;
  outputs: number;
  output: number;
  /** Which way light is walked */
  toward: "output" | "input";
  /** Expected loss, dB */
  loss_db: number;
  /** Limit loss, dB */
  loss_limit_db: number;
  basis: LossBasis;
  /** Who measured the loss and when, or the planning value with its published source */
  source: string;
  /** Glass from the path's start to where this begins, metres */
  glass_from_m: number;
};

export type Status = {
  /** Name of the program */
  program: "spanwright";
  /** Version of the program */
  version: string;
  /** Whose records these are */
  owner: string | null;
  /** What lengths people read first */
  unit: "m" | "ft";
  /** IANA time zone of the records */
  time_zone: string;
  posting: PostingRef | null;
  /** How many of each the records hold; joints counts joined pairs, fiber_sections pieces of one fiber between two passes */
  counts: {
    structures: number;
    spans: number;
    cables: number;
    enclosures: number;
    splitters: number;
    panels: number;
    joints: number;
    circuits: number;
    fiber_sections: number;
    postings: number;
  };
  /** West, south, east, north of all structures, degrees */
  extent: Array<number> | null;
  /** True where this is the demo that comes with the program */
  demo: boolean;
  /** A sentence to be shown on every screen where the records are invented; else null */
  invented: string | null;
  /** Jobs that planned joints name, for as_if; by code */
  jobs: Array<string>;
  /** Wavelengths in use by circuits, rising, nm */
  wavelengths_nm: Array<number>;
  /** Tile address that the operator named; null unless one was */
  tile: {
    /** Address of raster tiles with {z}, {x}, {y} */
    url: string;
    /** Whose tiles they are */
    attribution: string;
  } | null;
};

export type Structure = {
  /** Code */
  code: string;
  kind: StructureKind;
  /** Longitude, degrees, WGS 84 */
  lon: number;
  /** Latitude, degrees, WGS 84 */
  lat: number;
  /** Accuracy of the position, metres */
  accuracy_m: number | null;
  address: string | null;
  state: PlantState;
  /** Things shared with other plant: a bridge, a power feed */
  shared_risk: Array<string>;
  note: string | null;
  enclosures: Array<{
    /** Code */
    enclosure: string;
    kind: EnclosureKind;
    state: PlantState;
    /** Cables in it */
    cables: number;
  }>;
  spans: Array<{
    /** Code */
    span: string;
    /** Structure at the other end */
    to: string;
    placement: Placement;
    state: PlantState;
    /** Route length, metres */
    length_m: number;
    length_basis: LengthBasis;
    /** True bearing in which it leaves, degrees from north; null where it has no line */
    bearing_deg: number | null;
    cables: number;
    fibers: number;
  }>;
  /** Every run row that is at this structure */
  cables: Array<RunRowHere>;
  changed: PostingRef | null;
  /** The last posting that this answer takes in; 0 where the records are empty */
  posting: number;
};

export type StructureKind = "pole" | "handhole" | "manhole" | "vault" | "pedestal" | "cabinet" | "hut" | "building" | "point";

export type StretchEnd = {
  /** Structure */
  structure: string;
  /** An enclosure there; null where there is none */
  enclosure: string | null;
};

export type Suspect = {
  /** The likeliest span, where there is any */
  span?: string;
  /** The likeliest enclosure, where there is no span */
  enclosure?: string;
  /** All spans, in order along the route */
  spans: Array<string>;
  /** All enclosures, in order along the route */
  enclosures: Array<string>;
  /** The length of the spans together */
  route_m: number;
  /** Circuits that are down and lie on it */
  explains: number;
  /** Circuits that are up although they lie on it */
  contradicts: number;
  /** The natural logarithm of its odds; how it is reckoned stands in docs/SUSPECTS.md */
  score: number;
  /** cut (glass is broken), crossed (joints made wrongly where an enclosure was opened lately), end (equipment, jumper or drop behind a port) */
  kind: "cut" | "crossed" | "end";
  /** The tubes that it means, F-1/7; none where it means whole sheaths */
  tubes: Array<string>;
  /** The ports behind which it lies */
  ports: Array<string>;
  /** The circuits that it explains */
  explained: Array<string>;
  /** The circuits that contradict it */
  contradicted: Array<string>;
  /** Joints of trust unknown or reported on the paths of the explained circuits, the first few */
  rests_on: Array<DoubtfulJoint>;
  /** Of a stretch, the structures at which it begins and ends, with an enclosure there */
  ends: Array<StretchEnd>;
  /** Lines of the spans, in their order; a span that lies at one structure has none */
  lines: Array<Line>;
  /** Where the enclosures are, in their order */
  places: Array<Position>;
};

export type SuspectsAnswer = {
  /** Best first, the best hundred and those taken together */
  suspects: Array<Suspect>;
  /** How many suspects there are */
  total: number;
  /** The suspects that explain most when taken together */
  together: {
    /** Their places in the list, from 0 */
    suspects: Array<number>;
    score: number;
  };
  /** The last posting that the answer takes in */
  posting: number;
};

export type ThroughElement = {
  kind: "through";
  /** Enclosure */
  enclosure: string;
  /** Structure */
  structure: string;
  /** Cable */
  cable: string;
  fiber: number;
  /** Expected loss, dB */
  loss_db: number;
  /** Limit loss, dB */
  loss_limit_db: number;
  basis: LossBasis;
  /** Who measured the loss and when, or the planning value with its published source */
  source: string;
  /** Glass from the path's start to where this begins, metres */
  glass_from_m: number;
};

export type TraceAnswer = {
  /** The one asked for; null where paths differ */
  wavelength_nm: number | null;
  /** The last posting that this answer takes in; 0 where the records are empty */
  posting: number;
  paths: Array<Path>;
};

export type Trust = "planned" | "reported" | "posted" | "verified" | "unknown";

export type UseCounts = {
  in_use: number;
  jumpered: number;
  reserved: number;
  leased: number;
  dead: number;
  suspect: number;
  spare_unknown: number;
  spare: number;
  spare_verified: number;
};
