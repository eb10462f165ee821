// Types that the page's scripts share; read by the type check of the tests, not embedded.

/** A shown unit: one unit = size × SI unit. */
interface ShownUnit { symbol: string; size: number }

/** One step of the scale of utilization. */
interface ScaleStep { words: string; colour: string }

/** Where a column lies in the block. */
interface ColumnPlace { type: 'text' | 'number' | 'drawn' | 'byte'; at: number }

/** The head of the block of all candidates. */
interface BlockHead {
  count: number;
  texts: string[];
  columns: Record<string, ColumnPlace>;
  units: Record<'stress' | 'force' | 'moment' | 'length' | 'dimension', ShownUnit>;
  scale: ScaleStep[];
  outlines: number[][][];
  middle: [number, number, number];
  runId: string;
  file: string;
}

/** All candidates; numbers are SI, what is not known is NaN. */
interface MemberData extends BlockHead {
  /** Numbers of texts, in `texts`. */
  text(name: string): Uint32Array;
  number(name: string): Float64Array;
  drawn(name: string): Float32Array;
  byte(name: string): Uint8Array;
  /** The text of a candidate; empty where there is none. */
  textOf(name: string, index: number): string;
}

interface Figures {
  significant(value: number): string;
  fixed(value: number, decimals: number): string;
  count(value: number): string;
  utilization(value: number): string;
  /** An SI value in a shown unit, without the unit. */
  inUnit(si: number, unit: ShownUnit): string;
}

/** A column that the table can show. */
interface TableColumn {
  id: string;
  title: string;
  /** Width [em]. */
  width: number;
  isShown: boolean;
  isNumber: boolean;
  /** What a cell shows. */
  show(data: MemberData, index: number): string;
  /** What the CSV file holds. */
  value(data: MemberData, index: number): string | number;
  /** Keys to sort by; NaN last. */
  keys(data: MemberData): ArrayLike<number>;
}

/** The table of all candidates. */
interface MembersTable {
  /** Candidates that pass the filters, in the order of the table. */
  readonly shown: Uint32Array;
  select(index: number): void;
  filter(values: Record<string, string>): void;
  csv(): string;
}

/** The view in space. */
interface SpaceView {
  pick(x: number, y: number): number;
  placeOf(index: number): { x: number, y: number };
  cut(): void;
  select(index: number): void;
  show(indices: ArrayLike<number>): void;
  fit(indices: ArrayLike<number>): void;
}

/** What the scripts of the page share. */
interface MemberScan {
  data?: MemberData;
  table?: MembersTable;
  view?: SpaceView;
  /** The candidate that is selected; -1 for none. */
  selected: number;
  figures: Figures;
  words: { verdicts: string[]; symbols: string[]; styles: string[] };
  columns: TableColumn[];
  /** Title of a column with its unit. */
  titleOf(column: TableColumn, data: MemberData): string;
  readBlock(base64: string): Promise<MemberData>;
  startTable(data: MemberData): MembersTable;
  startPanel(data: MemberData): void;
  /** Bundled apart; absent where it was built without Node. */
  startView?: (container: HTMLElement, data: MemberData) => SpaceView | undefined;
  /** Whether the table gives rows their sheets; the sheets then add no buttons of their own. */
  ownsRows: boolean;
  /** Draws the sheet of a candidate and tells whether the page holds it; absent where no drawing is embedded. */
  showSheet?: (container: HTMLElement, memberKey: string) => Promise<boolean>;
  /** Selects a candidate everywhere; −1 for none. */
  select(index: number): void;
  /** Index of a key; −1 if there is no such candidate. */
  indexOf(key: string): number;
  on(event: 'select' | 'filter', listener: () => void): void;
  tell(event: 'select' | 'filter'): void;
  /** Resolves once the page can be used. */
  ready: Promise<void>;
}

declare var memberScan: MemberScan;

interface Uint8ArrayConstructor {
  fromBase64?(text: string): Uint8Array<ArrayBuffer>;
}
