/** What this page is made of, under which licences, and how to replace the libraries in it. */
import { element } from "../pane/element";
import { ask } from "./dialogs";
import libraries from "./libraries.json";

export function showAbout(): Promise<void> {
  return ask<void>(
    "About Stillwall",
    [...words(), licenceTable(), bundledPackages()],
    [{ label: "Close", value: undefined, strong: true }],
  );
}

function words(): (string | Node)[] {
  return [
    "Worksheet functions for heat at constant volume. They run in this browser; nothing that you type or open leaves this computer.",
    "Stillwall itself is under the MIT licence and comes without any warranty. Results are for trained people to judge: they are no design, " +
      "relief or rating calculation, and local codes and licensed practice govern.",
    element("h3", {}, "Libraries on this page"),
    "They stand unchanged as files of their own in the folder lib beside this page. To use another version or a build of your own, put it " +
      "in place of the file there under the same name and load the page again.",
  ];
}

function licenceTable(): HTMLElement {
  const rows = libraries.map((library) => {
    const licence = library.files.find((file) => /LICENSE|README/.test(file.to));
    const link = element("a", { href: licence?.to ?? "", target: "_blank", rel: "noopener" }, library.licence);
    return element(
      "tr",
      {},
      element("th", { scope: "row" }, `${library.name} ${library.version}`),
      element("td", {}, library.use),
      element("td", {}, link),
    );
  });
  return element("table", {}, element("tbody", {}, ...rows));
}

/** The build writes the texts of everything that went into the page's own script. */
function bundledPackages(): HTMLElement {
  const link = element("a", { href: "licences.txt", target: "_blank", rel: "noopener" }, "licences.txt");
  const own = element("a", { href: "LICENSE.txt", target: "_blank", rel: "noopener" }, "LICENSE.txt");
  return element("p", {}, "Licences of the packages inside the page's own script: ", link, ". Stillwall's own: ", own, ".");
}
