import type { CellName } from "@/lib/demo/cells";
import type { Build, DemoModel } from "@/lib/demo/models";

/** What can hurt at an operation; each key has a caution at the kiosk. */
export type Hazard =
  | "dust"
  | "noise"
  | "solvent"
  | "spray"
  | "hot-surface"
  | "rollers"
  | "crush"
  | "fumes";

/** A piece of work of the routing, with the figures the simulation works by. */
export interface DemoOperation {
  code: string;
  name: string;
  stage: string;
  cell: CellName;
  /** `inspect` operations pass or fail pieces; all others are run. */
  activity: "run" | "inspect";
  builds: readonly Build[];
  /** Only on instruments with pickups. */
  electricOnly: boolean;
  /** `whole` where one technician builds the instrument, `parts` where it goes by stations. */
  assembly: "whole" | "parts" | "either";
  /** Person-minutes by standard: per ticket for make-ready, per piece for the work. */
  setupMinutes: number;
  runMinutes: number;
  /** Hours for which the work then rests: clamps, glue, coats, strings settling. */
  restsHours: number;
  /** How many tickets one person takes in hand at once: a rack of bodies, two machines. */
  together: number;
  hazards: readonly Hazard[];
}

type Row = readonly [
  code: string,
  name: string,
  on: string,
  setupMinutes: number,
  runMinutes: number,
  restsHours: number,
  hazards?: string,
];

/**
 * `F` flat-top, `A` archtop, `S` solid body, `e` only with pickups, `w` only where one technician
 * assembles the whole instrument, `p` only where it goes by parts, a figure: tickets at once.
 */
const table: Record<string, { cell: CellName; rows: readonly Row[] }[]> = {
  Timber: [
    {
      cell: "Mill",
      rows: [
        ["010", "Select and match wood", "FAS", 0, 8, 0],
        ["020", "Plane and thickness plates", "FA", 8, 11, 0, "dust noise rollers"],
        ["030", "Join top and back", "FA", 0, 18, 14],
        ["050", "Glue up body blank", "S", 6, 9, 14, "crush"],
        ["060", "Saw neck blank", "FAS", 6, 6, 0, "dust noise"],
      ],
    },
  ],
  Machining: [
    {
      cell: "CNC",
      rows: [
        ["070", "Cut plates to outline", "F2", 12, 8, 0, "dust noise"],
        ["080", "Carve plates", "A2", 18, 24, 0, "dust noise"],
        ["090", "Rout body", "S2", 18, 14, 0, "dust noise"],
        ["100", "Rough neck", "FAS2", 14, 10, 0, "dust noise"],
        ["110", "Slot fingerboard", "FAS", 10, 7, 0, "dust noise"],
      ],
    },
  ],
  Body: [
    {
      cell: "Body",
      rows: [
        ["120", "Inlay rosette", "F", 0, 14, 4],
        ["130", "Brace top and back", "FA", 0, 36, 12],
        ["150", "Tune top", "FA", 0, 17, 0],
        ["160", "Bend sides", "FA", 10, 17, 12, "hot-surface"],
        ["170", "Block and line rim", "FA", 0, 26, 4],
        ["180", "Close box", "FA", 0, 20, 14, "crush"],
        ["190", "Shape and sand body edge", "S", 6, 24, 0, "dust noise"],
      ],
    },
    { cell: "Inspection", rows: [["200", "Check body", "FASi", 0, 4, 0]] },
  ],
  Binding: [
    {
      cell: "Binding",
      rows: [
        ["210", "Rout binding ledge", "FA", 8, 12, 0, "dust noise"],
        ["220", "Bind and purfle", "FA", 0, 34, 14, "fumes"],
        ["230", "Scrape binding", "FA", 0, 16, 0],
      ],
    },
  ],
  Neck: [
    {
      cell: "Neck",
      rows: [
        ["250", "Fit truss rod and glue fingerboard", "FAS", 0, 18, 14, "crush"],
        ["260", "Radius and inlay fingerboard", "FAS", 6, 25, 0, "dust"],
        ["280", "Fret press and level", "FAS", 8, 18, 0, "crush"],
        ["290", "Trim and bevel frets", "FAS", 0, 10, 0],
        ["300", "Carve neck", "FAS", 0, 22, 0, "dust"],
        ["310", "Fit neck joint", "FAS", 0, 13, 0],
        ["320", "Sand neck", "FAS", 0, 12, 0, "dust"],
      ],
    },
    { cell: "Inspection", rows: [["330", "Check neck", "FASi", 0, 4, 0]] },
  ],
  Finish: [
    { cell: "Body", rows: [["340", "Sand body for finish", "FAS", 0, 18, 0, "dust"]] },
    { cell: "Inspection", rows: [["350", "Check before finish", "FASi", 0, 5, 0]] },
    {
      cell: "Spray",
      rows: [
        ["360", "Fill grain and stain", "FAS3", 0, 13, 14, "solvent"],
        ["370", "Spray sealer", "FAS4", 8, 8, 5, "spray solvent"],
        ["380", "Spray colour", "AS4", 10, 11, 5, "spray solvent"],
        ["390", "Spray clear coat", "FAS4", 10, 18, 96, "spray solvent"],
      ],
    },
    {
      cell: "Buff",
      rows: [
        ["400", "Level coats", "FAS", 0, 20, 0, "dust"],
        ["410", "Cut and buff", "FAS", 5, 16, 14, "hot-surface"],
      ],
    },
    { cell: "Inspection", rows: [["420", "Check finish", "FASi", 0, 5, 0]] },
  ],
  Electrics: [
    {
      cell: "Pickups",
      rows: [
        ["430", "Wind and pot pickups", "ASe2", 8, 20, 2, "hot-surface fumes"],
        ["450", "Build harness", "FASe", 0, 14, 0, "hot-surface fumes"],
      ],
    },
  ],
  Assembly: [
    {
      cell: "Assembly",
      rows: [
        ["460", "Set neck", "FA", 0, 15, 14],
        ["470", "Glue bridge", "F", 0, 13, 14],
        ["480", "Bolt on neck", "Sp", 0, 8, 0],
        ["490", "Fit hardware", "Sp", 0, 18, 0],
        ["495", "Assemble whole instrument", "ASw", 0, 42, 0, "hot-surface fumes"],
        ["500", "Fit harness and pickups", "FSep", 0, 16, 0, "hot-surface fumes"],
      ],
    },
    { cell: "Inspection", rows: [["510", "Electrical test", "FASei", 0, 4, 0]] },
  ],
  "Set-up": [
    {
      cell: "Final set-up",
      rows: [
        ["520", "Level and crown frets", "FAS", 0, 18, 0],
        ["530", "Cut nut and saddle", "FAS", 0, 18, 0],
        ["550", "String and tune", "FAS", 0, 10, 24],
        ["560", "Set action and intonation", "FAS", 0, 16, 0],
      ],
    },
    {
      cell: "Inspection",
      rows: [["580", "Play test and final inspection", "FASi", 0, 12, 0]],
    },
    { cell: "Final set-up", rows: [["590", "Clean, case and label", "FAS", 0, 8, 0]] },
  ],
};

const builds: Record<string, Build> = { F: "flat-top", A: "archtop", S: "solid" };

/** Every operation of the factory in routing order; the codes rise with it. */
export const operations: readonly DemoOperation[] = Object.entries(table).flatMap(
  ([stage, groups]) =>
    groups.flatMap(({ cell, rows }) => rows.map((row) => operationOf(stage, cell, row))),
);

/** The operations that an instrument of this model goes through, in order. */
export function routingOf(model: DemoModel): DemoOperation[] {
  const other = model.whole ? "parts" : "whole";
  return operations.filter(
    ({ builds: fits, electricOnly, assembly }) =>
      fits.includes(model.build) && (model.electric || !electricOnly) && assembly !== other,
  );
}

function operationOf(stage: string, cell: CellName, row: Row): DemoOperation {
  const [code, name, on, setupMinutes, runMinutes, restsHours, hazards = ""] = row;
  return {
    code,
    name,
    stage,
    cell,
    activity: on.includes("i") ? "inspect" : "run",
    builds: [...on].flatMap((letter) => builds[letter] ?? []),
    electricOnly: on.includes("e"),
    assembly: on.includes("w") ? "whole" : on.includes("p") ? "parts" : "either",
    setupMinutes,
    runMinutes,
    restsHours,
    together: Number(/\d/.exec(on)?.[0] ?? 1),
    // safe because the table above spells the keys of Hazard, and a test reads each of them
    hazards: hazards.split(" ").filter(Boolean) as Hazard[],
  };
}
