/**
 * Typing over a cell: the first key replaces what the cell held. The grid redraws its input field only a moment later; until then the old text
 * still stands in it, and a second key that comes in between would be joined to it: `35` typed quickly over `2` became `352`. Here the field is
 * put right at once.
 */
import { components } from "./engine";

/** The parts of the grid's input field that are used. */
interface InputField {
  shouldProcessInputEvents: boolean;
  props: { composerStore: { editionMode: string; currentContent: string } };
  contentHelper: {
    setText(lines: { value: string; classes: string[] }[][]): void;
    selectRange(start: number, end: number): void;
  };
  onInput(event: InputEvent): void;
}

export function mendFirstKey(): void {
  const field = components.Composer.prototype as unknown as InputField;
  const { onInput } = field;
  field.onInput = function (this: InputField, event) {
    const { composerStore } = this.props;
    const begins = this.shouldProcessInputEvents && composerStore.editionMode === "inactive";
    onInput.call(this, event);
    if (!begins || composerStore.editionMode === "inactive") return;
    const text = composerStore.currentContent;
    this.contentHelper.setText([[{ value: text, classes: [] }]]);
    this.contentHelper.selectRange(text.length, text.length);
  };
}
