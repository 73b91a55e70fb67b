"""Times hard recalculations of a polynomial typed by hand, in a LibreOffice that listens on a pipe.

Needs the python of the system, which has the module uno. Arguments: pipe name, number of rows, formula of row 1.
Prints one JSON object: seconds of each recalculation, value of the last cell.
"""

import json
import sys
import time

import uno
from com.sun.star.beans import PropertyValue
from com.sun.star.connection import NoConnectException

TURNS = 5


def connect(pipe):
    """The desktop of the office behind the pipe; it needs some seconds to come up."""
    local = uno.getComponentContext()
    resolver = local.ServiceManager.createInstanceWithContext("com.sun.star.bridge.UnoUrlResolver", local)
    for _ in range(120):
        try:
            context = resolver.resolve(f"uno:pipe,name={pipe};urp;StarOffice.ComponentContext")
            return context.ServiceManager.createInstanceWithContext("com.sun.star.frame.Desktop", context)
        except NoConnectException:
            time.sleep(0.5)
    raise SystemExit("LibreOffice did not answer on its pipe within a minute")


def measure(desktop, rows, formula):
    hidden = PropertyValue()
    hidden.Name, hidden.Value = "Hidden", True
    document = desktop.loadComponentFromURL("private:factory/scalc", "_blank", 0, (hidden,))
    sheet = document.Sheets.getByIndex(0)
    temperatures = tuple((300 + 2700 * i / rows,) for i in range(rows))
    sheet.getCellRangeByName(f"A1:A{rows}").setDataArray(temperatures)
    # The programming interface separates arguments by semicolons. Filled down, as a person does it.
    sheet.getCellByPosition(1, 0).setFormula(formula.replace(",", ";"))
    sheet.getCellRangeByName(f"B1:B{rows}").fillAuto(uno.Enum("com.sun.star.sheet.FillDirection", "TO_BOTTOM"), 1)
    document.calculateAll()
    seconds = []
    for _ in range(TURNS):
        start = time.perf_counter()
        document.calculateAll()
        seconds.append(time.perf_counter() - start)
    last = sheet.getCellByPosition(1, rows - 1).Value
    document.close(True)
    return {"seconds": seconds, "last": last}


if __name__ == "__main__":
    desktop = connect(sys.argv[1])
    try:
        print(json.dumps(measure(desktop, int(sys.argv[2]), sys.argv[3])))
    finally:
        desktop.terminate()
