import fc from "fast-check";
import { CLOSED, listed, pressed, type ListState } from "../../src/pane/combobox";

const open = (count: number, active = -1): ListState => ({ open: true, count, active });

describe("the search list by keyboard", () => {
  test("a list of something opens with nothing active, an empty one stays closed", () => {
    expect(listed(3)).toEqual({ open: true, count: 3, active: -1 });
    expect(listed(0)).toEqual(CLOSED);
  });

  test("arrows go round both ends", () => {
    expect(pressed(open(3), "ArrowDown").state.active).toBe(0);
    expect(pressed(open(3, 2), "ArrowDown").state.active).toBe(0);
    expect(pressed(open(3), "ArrowUp").state.active).toBe(2);
    expect(pressed(open(3, 0), "ArrowUp").state.active).toBe(2);
  });

  test("an arrow opens a closed list at its first or last option", () => {
    const closed: ListState = { open: false, count: 4, active: -1 };
    expect(pressed(closed, "ArrowDown").state).toEqual(open(4, 0));
    expect(pressed(closed, "ArrowUp").state).toEqual(open(4, 3));
  });

  test("Alt with an arrow opens and closes without moving", () => {
    expect(pressed({ open: false, count: 4, active: -1 }, "ArrowDown", true).state).toEqual(open(4));
    expect(pressed(open(4, 2), "ArrowUp", true).state).toEqual({ open: false, count: 4, active: -1 });
  });

  test("Enter takes the active option and asks for the text if there is none", () => {
    expect(pressed(open(4, 1), "Enter")).toEqual({ state: { open: false, count: 4, active: 1 }, act: "choose", handled: true });
    expect(pressed(open(4), "Enter").act).toBe("ask");
    expect(pressed(CLOSED, "Enter").act).toBe("ask");
  });

  test("Escape closes first and clears second", () => {
    const first = pressed(open(4, 1), "Escape");
    expect(first).toMatchObject({ act: "none", handled: true, state: { open: false, active: -1 } });
    expect(pressed(first.state, "Escape").act).toBe("clear");
  });

  test("Tab closes and lets the focus go on; letters are the field's", () => {
    expect(pressed(open(4, 1), "Tab")).toMatchObject({ handled: false, state: { open: false } });
    expect(pressed(open(4, 1), "n")).toEqual({ state: open(4, 1), act: "none", handled: false });
  });

  test("no sequence of keys reaches an option that is not there", () => {
    const keys = fc.array(fc.tuple(fc.constantFrom("ArrowDown", "ArrowUp", "Enter", "Escape", "Tab", "x"), fc.boolean()));
    fc.assert(
      fc.property(fc.nat(5), keys, (count, presses) => {
        let state = listed(count);
        for (const [key, alt] of presses) {
          const step = pressed(state, key, alt);
          if (step.act === "choose") expect(step.state.active).toBeGreaterThanOrEqual(0);
          state = step.state;
          expect(state.active).toBeLessThan(Math.max(1, state.count));
          if (state.active >= 0) expect(state.count).toBeGreaterThan(0);
        }
      }),
    );
  });
});
