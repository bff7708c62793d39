export interface KitOrder {
  number: string;
  kit: string;
  customer: string;
  serial: string;
  wantedOn: string;
  priority: number;
  options: string;
  note: string;
}

const LIST: [string, string, string, string, string, number, string, string][] = [
  [
    "KO-0147",
    "S2",
    "Ottilie Brandreth, Redholm Staithe",
    "029",
    "2026-12-11",
    10,
    "TRAILER",
    "Deposit paid; collects with own van.",
  ],
  [
    "KO-0148",
    "S2",
    "Marsh Rangers of Sandle Level",
    "030",
    "2026-12-14",
    20,
    "NIGHT+HEATER",
    "Two crews build it together.",
  ],
  [
    "KO-0151",
    "S4",
    "Fenna Tolhurst and Sons, Eelmere",
    "009",
    "2026-12-18",
    30,
    "CANOPY",
    "Second S4 for the same yard.",
  ],
  [
    "KO-0149",
    "S2",
    "Jasper Quillon",
    "031",
    "2026-12-18",
    40,
    "",
    "Wants the orange deck from the same batch.",
  ],
  ["KO-0150", "S2", "Piet Hallendoorn, Lowwater", "032", "2027-01-08", 50, "CANOPY+NIGHT", ""],
  [
    "KO-0152",
    "S2",
    "Greywater Angling Club",
    "033",
    "2027-01-15",
    50,
    "COVER+WHEELS",
    "Club night on the 20th.",
  ],
  [
    "KO-0154",
    "S2",
    "Nessa Corrigall, Skarra View",
    "034",
    "2027-01-22",
    60,
    "HEATER",
    "Ships by the island boat, Tuesdays.",
  ],
  [
    "KO-0153",
    "S2",
    "Saltern School of Engineering",
    "035",
    "2027-01-29",
    60,
    "",
    "School order: invoice after term starts.",
  ],
  [
    "KO-0155",
    "S4",
    "Mudflat Rescue Volunteers, Cold Ness",
    "010",
    "2027-02-05",
    70,
    "NIGHT+HEATER+WHEELS",
    "Hi-vis decals supplied by them.",
  ],
  ["KO-0156", "S2", "Aurelio Benning", "036", "2027-02-12", 80, "COVER", ""],
  [
    "KO-0158",
    "S2",
    "Tamsin and Rolf Eckersund",
    "037",
    "2027-02-26",
    90,
    "CANOPY+HEATER",
    "First build; send the papers ahead.",
  ],
  [
    "KO-0157",
    "S4",
    "Broadholm Wildfowl Survey",
    "011",
    "2027-03-19",
    100,
    "CANOPY+NIGHT",
    "Grant money must be spent by end of March.",
  ],
];

/** Twelve open kit orders, first to be served first. */
export function kitOrders(): KitOrder[] {
  return LIST.map(([number, kit, customer, serial, wantedOn, priority, options, note]) => ({
    number,
    kit,
    customer,
    serial,
    wantedOn,
    priority,
    options,
    note,
  }));
}
