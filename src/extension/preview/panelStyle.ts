import { partStyle } from "../../report/pageStyle.js";
import { pageColours } from "../../report/palette.js";

/**
 * The style sheet of the preview's page: the report's parts on the editor's ground, in the editor's letters and colours.
 * The first curve and the accent are the editor's colour of links; hues that the editor has no colour for are the
 * report's own of that kind of theme.
 */
export const panelStyle = `
body { ${pageColours("light")} }
body.vscode-dark { ${pageColours("dark")} }
body.vscode-high-contrast { ${pageColours("highContrast")} }
body.vscode-high-contrast-light { ${pageColours("highContrastLight")} }
body { --ink: var(--vscode-editor-foreground); --faint: var(--vscode-descriptionForeground, var(--ink)); --accent: var(--vscode-textLink-foreground); --curve-1: var(--accent); --focus: var(--vscode-focusBorder); --rule: var(--vscode-editorWidget-border, var(--vscode-contrastBorder, var(--faint))); }
body.vscode-high-contrast { --faint: var(--ink); --rule: var(--vscode-contrastBorder); }
* { box-sizing: border-box; }
body { margin: 0; padding: 0; background: var(--vscode-editor-background); color: var(--ink); font: 13.5px/1.5 var(--vscode-font-family); font-variant-numeric: lining-nums tabular-nums; }
header, main, footer { max-width: 46rem; margin: 0 auto; padding: 0 1.1rem; }
header { position: sticky; top: 0; z-index: 2; background: var(--vscode-editor-background); display: flex; flex-wrap: wrap; align-items: baseline; gap: .2rem .9rem; padding-top: .5rem; padding-bottom: .35rem; }
header h2 { font-size: 1em; font-weight: 400; color: var(--faint); overflow-wrap: anywhere; }
#sign { flex: 1 1 14rem; margin: 0; padding-left: .7rem; border-left: 3px double var(--ink); }
#said { flex: 1 1 100%; margin: 0; }
#sign:empty, #said:empty { display: none; }
#runs { margin-left: auto; }
select, input { font: inherit; color: var(--vscode-input-foreground); background: var(--vscode-input-background); border: 1px solid var(--vscode-input-border, var(--vscode-contrastBorder, var(--faint))); padding: .1rem .3rem; }
select { color: var(--vscode-dropdown-foreground); background: var(--vscode-dropdown-background); }
main { min-height: 60vh; }
${partStyle}
h3 { font-size: 1.25em; margin: .7rem 0 .9rem; }
details { margin: 0 0 1.1rem; }
summary { cursor: pointer; padding: .2rem 0; border-bottom: 1px solid var(--rule); margin-bottom: .5rem; }
table, .causes { font-size: 1em; }
figure { margin: .8rem 0; }
figcaption, caption, thead th, .line { font-size: .92em; }
.facts th { width: 11rem; }
button { font: inherit; cursor: pointer; }
button.line { border: 0; padding: 0 .15rem; background: none; color: var(--faint); }
button.line:hover { color: var(--accent); text-decoration: underline; }
button.line[aria-current] { color: var(--ink); text-decoration: underline; text-decoration-thickness: 2px; text-underline-offset: .2em; }
tr.leads { cursor: pointer; }
tr.leads:hover > * { background: var(--vscode-list-hoverBackground); }
tr:has(button.line[aria-current]) > * { background: var(--vscode-editor-lineHighlightBackground); }
body :is(a, button, input, select, summary, .plot, .wide):focus-visible { outline: 1px solid var(--focus); outline-offset: 1px; }
body.vscode-high-contrast :is(a, button, input, select, summary, .plot, .wide):focus-visible { outline-width: 2px; }
.axis { margin: 0; color: var(--ink); font-size: .92em; }
.axis.time { text-align: right; padding-right: .6rem; }
.plot { position: relative; min-height: 320px; touch-action: pan-y; cursor: crosshair; overflow: hidden; user-select: none; }
.plot.points { cursor: pointer; }
.plot canvas { display: block; }
.span { position: absolute; pointer-events: none; background: var(--accent); opacity: .16; }
body.vscode-high-contrast .span { background: none; opacity: 1; border: 2px dashed var(--ink); }
.reading { min-height: 1.5em; margin: .2rem 0; color: var(--ink); }
form.window { display: flex; flex-wrap: wrap; gap: .3rem .45rem; align-items: baseline; margin: .2rem 0 .6rem; }
form.window button, footer button { color: var(--vscode-button-secondaryForeground); background: var(--vscode-button-secondaryBackground); border: 1px solid var(--vscode-button-border, transparent); padding: .1rem .6rem; }
form.window button:hover, footer button:hover { background: var(--vscode-button-secondaryHoverBackground); }
body.vscode-high-contrast form.window button, body.vscode-high-contrast footer button { border-color: var(--vscode-contrastBorder); }
footer { padding-top: .8rem; padding-bottom: 2rem; color: var(--ink); }
body:not(.filled) footer { display: none; }
#exports { display: flex; flex-wrap: wrap; gap: .3rem .5rem; align-items: baseline; }
`;
