/**
 * What Excel loads, as one module: two or three entries on a page would keep the modules they share apart from each other in the bundle.
 * host.ts comes first.
 */
import "../functions/host";
import "../functions";
import "./taskpane";
