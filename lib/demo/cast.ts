import type { CellName } from "@/lib/demo/cells";
import { type Random, randomFrom } from "@/lib/demo/random";
import type { Language } from "@/lib/kiosks/languages";
import { drawPin } from "@/lib/people/pin";

/** Which shifts someone works; `lib/demo/shifts` has the hours. */
export type Pattern = "day" | "evening" | "night" | "weekend-day" | "weekend-night";

/** Someone who clocks labour at Larkmoor Stringworks. Every name is invented. */
export interface CastMember {
  number: string;
  name: string;
  language: Language;
  cell: CellName;
  /** Cells where the person lends a hand when the own cell has nothing to do. */
  also: readonly CellName[];
  pattern: Pattern;
  /** The cells that the person leads; empty for most. */
  leads: readonly CellName[];
  pin: string;
}

type Row = readonly [name: string, pattern: Pattern, language?: Language, leads?: CellName[]];

const rows: Record<CellName, readonly Row[]> = {
  Mill: [
    ["Marit Oyelaran", "day", "en", ["Mill", "CNC"]],
    ["Teodoro Quispe Luna", "day", "es"],
    ["Hamish Drummore", "day"],
    ["Phùng Anh Thư", "evening"],
  ],
  CNC: [
    ["Ruslan Bektemir", "day"],
    ["Odalys Ferreyra", "day", "es"],
    ["Kwabena Tuffour", "evening"],
    ["Sunniva Haraldstad", "night"],
    ["Joaquín Mireles", "weekend-day", "es"],
  ],
  Body: [
    ["Bridget Oakshott", "day", "en", ["Body", "Binding"]],
    ["Nilufar Toshmat", "day"],
    ["Eamon Sallow", "day"],
    ["Lupe Arreguín", "day", "es"],
    ["Tariq Benhaddou", "day"],
    ["Saoirse Kilbane", "day"],
    ["Đoàn Gia Lộc", "evening", "en", ["Body", "Binding", "Neck"]],
    ["Wendeline Brouwer", "evening"],
    ["Isidro Calvillo", "evening", "es"],
    ["Mandla Dlomo", "night"],
    ["Ewa Grzelczyk", "weekend-day"],
  ],
  Binding: [
    ["Petra Vasiljevska", "day"],
    ["Chidera Umeano", "day"],
    ["Rosalba Pech", "day", "es"],
    ["Aulis Rantakari", "evening"],
  ],
  Neck: [
    ["Gareth Penhallow", "day", "en", ["Neck"]],
    ["Lương Thị Hạnh", "day"],
    ["Yesenia Tamayo-Ruiz", "day", "es"],
    ["Dmytro Holovchak", "day"],
    ["Aminata Sylla-Bah", "day"],
    ["Haruki Senzaki", "day"],
    ["Leocadia Zamudio", "evening", "es"],
    ["Torvald Engebakk", "evening"],
    ["Pilar Otxoa", "evening", "es"],
    ["Ignacio Barranco", "evening", "es"],
    ["Oluwaseun Bakinde", "night"],
    ["Jessamy Thornhollow", "weekend-day"],
    ["Emrys Cadwallon", "weekend-night"],
  ],
  Spray: [
    ["Danica Petrosjan", "day", "en", ["Spray", "Buff"]],
    ["Baltazar Nájera", "day", "es"],
    ["Shanthi Velmurugan", "day"],
    ["Colm Tierney-Ash", "day"],
    ["Meseret Woldu", "evening"],
  ],
  Buff: [
    ["Ottilie Brandvold", "day"],
    ["Fabián Iturriza", "day", "es"],
    ["Lindiwe Sokhulu", "evening"],
    ["Stellan Håkansbo", "night"],
  ],
  Pickups: [
    ["Wen Peiyu", "day"],
    ["Graciela Uribarri", "day", "es"],
    ["Arvid Njelstad", "weekend-night"],
  ],
  Assembly: [
    ["Philippa Wrathall", "day", "en", ["Pickups", "Assembly"]],
    ["Xóchitl Barrientos", "day", "es"],
    ["Zoltán Kerekesi", "day"],
    ["Malia Keanuenue", "evening"],
  ],
  "Final set-up": [
    ["Ambrose Tollivant", "day", "en", ["Final set-up", "Inspection"]],
    ["Nayeli Coronel", "day", "es"],
    ["Henrike Osterwald", "day"],
    ["Sefa Matagi", "day"],
    ["Quentin Marrowby", "evening"],
    ["Adaeze Nwokeji", "night"],
    ["Søren Falkenby", "weekend-night"],
  ],
  Inspection: [
    ["Roswitha Klamm", "day"],
    ["Evelio Santoyo", "day", "es"],
    ["Imogen Fairlough", "evening"],
    ["Bashir Nooristan", "weekend-day"],
  ],
};

/** Who can help whom: benches that are near each other in skill, nearest first. */
const neighbours: Record<CellName, readonly CellName[]> = {
  Mill: ["CNC", "Body"],
  CNC: ["Mill", "Body"],
  Body: ["Binding", "Mill"],
  Binding: ["Body", "Neck"],
  Neck: ["Final set-up", "Binding", "Inspection"],
  Spray: ["Buff"],
  Buff: ["Spray", "Body"],
  Pickups: ["Assembly", "Neck"],
  Assembly: ["Final set-up", "Pickups"],
  "Final set-up": ["Inspection", "Assembly", "Neck"],
  Inspection: ["Final set-up", "Buff"],
};

/** Everyone who clocks labour, by number; the same people with the same PINs each time. */
export const cast: readonly CastMember[] = castOf(randomFrom("larkmoor cast"));

function castOf(random: Random): CastMember[] {
  let number = 1000;
  return Object.entries(rows).flatMap(([cell, people]) =>
    people.map(([name, pattern, language = "en", leads = []]) => {
      number += random.whole(1, 6);
      // safe because the keys of the table above are cell names
      const home = cell as CellName;
      const also = neighbours[home];
      return {
        number: String(number),
        name,
        language,
        cell: home,
        also,
        pattern,
        leads,
        pin: drawPin((below) => random.whole(0, below - 1), String(number)),
      };
    }),
  );
}
