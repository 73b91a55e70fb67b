/**
 * The grid's engine as this page uses it. In the built page both packages are global objects, loaded unchanged from lib/ so that a user can
 * replace them; this file is the one place of the page that names them.
 */
export * as library from "@odoo/o-spreadsheet";
export { CompiledFormula, components, CorePlugin, Model, Spreadsheet, load, registries } from "@odoo/o-spreadsheet";
export { App, Component, useState, xml } from "@odoo/owl";
