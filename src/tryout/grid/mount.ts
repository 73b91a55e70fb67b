/** Draws a model in the page and redraws it when the workbook or the theme changes. */
import { App, Component, Model, Spreadsheet, useState, xml } from "./engine";
import type { Theme } from "../theme";

/** What the grid wants to say to the user; the page shows it in its own dialogs and notices. */
export interface GridVoice {
  notify(text: string): void;
  /** Asks; calls confirm or cancel. */
  ask(question: string, confirm: () => void, cancel?: () => void): void;
}

export interface MountedGrid {
  show(model: Model): void;
  setTheme(theme: Theme): void;
}

interface Shown {
  model: Model;
  theme: Theme;
  /** Counts the models shown: the grid's component is built anew for each. */
  turn: number;
}

const TEMPLATE_ADDRESS = "lib/o-spreadsheet/o_spreadsheet.xml";

/** Mounts the grid in `target`; the templates come from the library's own file beside the page. */
export async function mountGrid(target: HTMLElement, model: Model, theme: Theme, voice: GridVoice): Promise<MountedGrid> {
  const answer = await fetch(TEMPLATE_ADDRESS);
  if (!answer.ok) throw new Error(`The grid's templates could not be read: ${TEMPLATE_ADDRESS} answered ${answer.status}`);
  class Desk extends Component {
    static override template = xml`<Spreadsheet model="shown.model" colorScheme="shown.theme" t-key="shown.turn"
        notifyUser="notifyUser" raiseError="raiseError" askConfirmation="askConfirmation"/>`;
    static components = { Spreadsheet };
    static override props = {};
    // A model must not become a reactive proxy: it holds the whole workbook. So it is read through `turn`.
    state = useState({ theme, turn: 0 });
    held = model;
    notifyUser = ({ text }: { text: string }) => voice.notify(text);
    raiseError = (text: string, done?: () => void) => (voice.notify(text), done?.());
    askConfirmation = (text: string, confirm: () => void, cancel?: () => void) => voice.ask(text, confirm, cancel);
    get shown(): Shown {
      return { model: this.held, theme: this.state.theme, turn: this.state.turn };
    }
  }
  const app = new App(Desk, { templates: await answer.text(), props: {}, env: {} });
  const desk = (await app.mount(target)) as Desk;
  return {
    show(next) {
      desk.held = next;
      desk.state.turn += 1;
    },
    setTheme(next) {
      desk.state.theme = next;
    },
  };
}
