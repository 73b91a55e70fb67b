/** The engine's own description of a workbook, as far as this page reads or writes it. */
export interface GridSheet {
  id: string;
  name: string;
  colNumber: number;
  rowNumber: number;
  /** By address; a formula starts with `=`, a text that looks like something else with `'`. */
  cells: Record<string, string | undefined>;
  styles?: Record<string, number>;
  formats?: Record<string, number>;
  borders?: Record<string, number>;
  merges?: string[];
  cols?: Record<number, { size?: number; isHidden?: boolean }>;
  rows?: Record<number, { size?: number; isHidden?: boolean }>;
  conditionalFormats?: unknown[];
  dataValidationRules?: unknown[];
  figures?: unknown[];
  tables?: unknown[];
  panes?: { xSplit: number; ySplit: number };
  headerGroups?: unknown;
  areGridLinesVisible?: boolean;
  isVisible?: boolean;
  isLocked?: boolean;
  color?: string;
}

export interface GridData {
  version: string;
  sheets: GridSheet[];
  styles?: Record<number, unknown>;
  formats?: Record<number, string>;
  borders?: Record<number, unknown>;
  namedRanges?: Record<string, string>;
}
