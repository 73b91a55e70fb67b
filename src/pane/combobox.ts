/**
 * Keyboard behaviour of an editable combobox with a list popup, after the ARIA Authoring Practices Guide
 * ("Editable Combobox With List Autocomplete"). Pure: a state and a key in, a state and an act out.
 *   Down / Up     next or previous option, round the ends; opens a closed list
 *   Enter         takes the active option, or asks for what is typed
 *   Escape        closes the list; in a closed list clears the text
 *   Alt+Down/Up   opens or closes without moving
 *   Tab           closes and lets the focus go on
 */
export interface ListState {
  readonly open: boolean;
  /** Number of options. */
  readonly count: number;
  /** Index of the active option, −1 for none. */
  readonly active: number;
}

export type Act = "none" | "choose" | "ask" | "clear";

export interface Step {
  readonly state: ListState;
  readonly act: Act;
  /** True if the browser's own action for the key must not happen. */
  readonly handled: boolean;
}

export const CLOSED: ListState = { open: false, count: 0, active: -1 };

/** The state after the list was filled anew for another query: open if there is anything, nothing active. */
export function listed(count: number): ListState {
  return { open: count > 0, count, active: -1 };
}

/** One key press. Keys that are not named above are left to the text field. */
export function pressed(state: ListState, key: string, alt = false): Step {
  switch (key) {
    case "ArrowDown":
      return moved(state, alt ? 0 : 1);
    case "ArrowUp":
      return alt ? { state: { ...state, open: false, active: -1 }, act: "none", handled: true } : moved(state, -1);
    case "Enter":
      if (state.open && state.active >= 0) return { state: { ...state, open: false }, act: "choose", handled: true };
      return { state, act: "ask", handled: true };
    case "Escape":
      if (state.open) return { state: { ...state, open: false, active: -1 }, act: "none", handled: true };
      return { state: CLOSED, act: "clear", handled: true };
    case "Tab":
      return { state: { ...state, open: false, active: -1 }, act: "none", handled: false };
    default:
      return { state, act: "none", handled: false };
  }
}

function moved(state: ListState, by: -1 | 0 | 1): Step {
  if (state.count === 0) return { state, act: "none", handled: true };
  if (by === 0) return { state: { ...state, open: true }, act: "none", handled: true };
  const first = by === 1 ? 0 : state.count - 1;
  const next = state.open && state.active >= 0 ? (state.active + by + state.count) % state.count : first;
  return { state: { ...state, open: true, active: next }, act: "none", handled: true };
}
