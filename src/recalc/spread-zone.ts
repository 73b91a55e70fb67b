/**
 * The cells that an array formula fills. The engine gives its own cell alone where the first value of the array is an error, though the
 * values beside it stand in their cells: there the zone is found by walking over the cells that the formula spreads to.
 */
export interface Zone {
  readonly top: number;
  readonly left: number;
  readonly bottom: number;
  readonly right: number;
}

interface Position {
  readonly sheetId: string;
  readonly row: number;
  readonly col: number;
}

/** The part of the engine's model that is asked. */
export interface SpreadingGetters {
  getSpreadZone(position: Position): Zone | undefined;
  getArrayFormulaSpreadingOn(position: Position): Position | undefined;
}

/** The zone of the formula in a cell; undefined if it fills its own cell alone. */
export function spreadZoneOf(getters: SpreadingGetters, position: Position): Zone | undefined {
  const zone = getters.getSpreadZone(position);
  if (zone === undefined) return undefined;
  const isOwn = (row: number, col: number) => {
    const from = getters.getArrayFormulaSpreadingOn({ sheetId: position.sheetId, row, col });
    return from !== undefined && from.row === position.row && from.col === position.col;
  };
  let { bottom, right } = zone;
  if (bottom === position.row && right === position.col) {
    while (isOwn(bottom + 1, position.col)) bottom++;
    while (isOwn(position.row, right + 1)) right++;
  }
  const isAlone = zone.top === bottom && zone.left === right;
  return isAlone ? undefined : { top: zone.top, left: zone.left, bottom, right };
}
