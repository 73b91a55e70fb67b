/**
 * A stand-in for office.js, sent to the browser in its place: a workbook of one sheet with a selected cell, enough for the pane.
 * It answers only after load() and sync(), as Excel does, so that a forgotten one shows.
 */

export interface FakeOffice {
  /** What Office.onReady answers: Excel, no host, or nothing until `book.answer()` is called. */
  readonly host: "Excel" | "none" | "silent";
  /** Background of the host's theme. */
  readonly background?: string;
}

/** What the test can do inside the page, as `window.book`. */
export interface FakeBook {
  readonly cells: Record<string, string>;
  /** Error code of the next write, such as `AccessDenied`. */
  failWith?: string;
  select(address: string): Promise<void>;
  /** Lets a silent Office answer that it is Excel. */
  answer(): void;
}

/** The script text. */
export function fakeOffice(settings: FakeOffice): string {
  return `(${install.toString()})(${JSON.stringify(settings)});`;
}

function install(settings: FakeOffice): void {
  const cells: Record<string, string> = { "Sheet1!A1": "", "Sheet1!B4": "=SUM(A1:A3)" };
  const listeners: (() => Promise<void>)[] = [];
  let selected = "Sheet1!A1";
  let release: (info: unknown) => void = () => undefined;
  const book: FakeBook = {
    cells,
    select: async (address) => {
      selected = address;
      await Promise.all(listeners.map((listener) => listener()));
    },
    answer: () => release({ host: "Excel" }),
  };
  const ready = {
    Excel: () => Promise.resolve({ host: "Excel" }),
    none: () => Promise.resolve({ host: null }),
    silent: () => new Promise((resolve) => (release = resolve)),
  }[settings.host];

  class ActiveCell {
    formulas: unknown;
    address: unknown;
    wanted = false;
    load() {
      this.wanted = true;
    }
  }
  const run = async (body: (context: unknown) => Promise<unknown>) => {
    const asked: ActiveCell[] = [];
    const sync = async () => {
      for (const cell of asked) {
        if (cell.wanted) Object.assign(cell, { address: selected, formulas: [[cells[selected] ?? ""]] });
        else write(cell.formulas as string[][]);
      }
    };
    const write = (formulas: string[][] | undefined) => {
      if (formulas === undefined) return;
      if (book.failWith) throw Object.assign(new Error("refused by the fake"), { code: book.failWith });
      cells[selected] = formulas[0]?.[0] ?? "";
    };
    const workbook = {
      getActiveCell: () => {
        const cell = new ActiveCell();
        asked.push(cell);
        return cell;
      },
      onSelectionChanged: { add: (listener: () => Promise<void>) => listeners.push(listener) },
    };
    return body({ workbook, sync });
  };
  Object.assign(window, {
    book,
    Excel: { run },
    CustomFunctions: { associate: () => undefined },
    Office: {
      onReady: ready,
      HostType: { Excel: "Excel" },
      EventType: { OfficeThemeChanged: "officeThemeChanged" },
      context: { officeTheme: { bodyBackgroundColor: settings.background ?? "#FFFFFF" }, document: { addHandlerAsync: () => undefined } },
    },
  });
}
