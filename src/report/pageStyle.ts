import { pageColours } from "./palette.js";

/** How tables, figures and words of a run look, wherever they stand; colours by the names of `pageColours`. */
export const partStyle = `
h1, h2, h3, h4, h5 { font-weight: 600; line-height: 1.25; margin: 0; }
h4 { display: inline; font-size: 1rem; }
h5 { font-size: 1rem; margin: 1.6rem 0 .3rem; }
p { margin: .5rem 0; }
summary:focus-visible, a:focus-visible, .wide:focus-visible { outline: 2px solid var(--accent); outline-offset: 2px; }
.gist, .line, caption, figcaption, footer { color: var(--faint); }
.gist { margin-left: .6rem; }
.line { font-size: .8rem; font-weight: 400; white-space: nowrap; }
.verdict { border-left: 2px solid var(--accent); padding-left: .8rem; margin: .8rem 0; }
.wide { overflow-x: auto; margin: .6rem 0 1rem; }
table { border-collapse: collapse; width: 100%; font-size: .95rem; }
caption { text-align: left; font-size: .85rem; padding-bottom: .2rem; }
th, td { text-align: left; vertical-align: baseline; padding: .22rem 1.1rem .22rem 0; font-weight: 400; }
thead th { color: var(--faint); font-size: .85rem; border-bottom: 1px solid var(--rule); }
thead td { border-bottom: 1px solid var(--rule); }
td:last-child { padding-right: 0; }
.facts th { color: var(--faint); width: 13rem; }
.facts td:nth-child(3) { text-align: right; width: 5rem; }
.unseen { position: absolute; width: 1px; height: 1px; overflow: hidden; clip-path: inset(50%); }
figure { margin: 1rem 0; }
figcaption { font-size: .85rem; margin-top: .4rem; }
ul { padding-left: 1.2rem; margin: .4rem 0; }
li { margin: .25rem 0; }
.budget { display: block; width: 100%; height: .6rem; }
.causes { list-style: none; padding: 0; font-size: .95rem; }
.random { fill: var(--curve-1); background: var(--curve-1); }
.common { fill: var(--mark); background: var(--mark); }
.sign { display: inline-block; width: .6rem; height: .6rem; margin-right: .5rem; }
.sign.common { border-radius: 50%; }
code { font: .72rem/1.4 ui-monospace, Consolas, monospace; overflow-wrap: anywhere; }
`;

/** The style sheet of the HTML report: one column, one accent, light and dark by the reader's setting, plain on paper. */
export const pageStyle = `
:root { color-scheme: light dark; ${pageColours("light")} --page: #fdfdfb; --rule: #d5d8d6; --accent: var(--curve-1); }
@media (prefers-color-scheme: dark) { :root { ${pageColours("dark")} --page: #17191b; --rule: #3a3f44; } }
@media print { :root { ${pageColours("light")} --page: #fff; --rule: #bbb; } }
* { box-sizing: border-box; }
body { margin: 0; background: var(--page); color: var(--ink); font: 1rem/1.55 Charter, "Bitstream Charter", "Iowan Old Style", Georgia, serif; font-variant-numeric: lining-nums tabular-nums; }
main, footer { max-width: 46rem; margin: 0 auto; padding: 0 1.25rem; }
main { padding-top: 3rem; }
${partStyle}
h1 { font-size: 1.75rem; }
h2 { font-size: 1.15rem; color: var(--faint); font-weight: 400; margin: .3rem 0 2rem; overflow-wrap: anywhere; }
h3 { font-size: 1.35rem; margin: 2.5rem 0 1rem; padding-top: .8rem; border-top: 2px solid var(--accent); }
article + article { margin-top: 4rem; }
a { color: var(--accent); }
details { margin: 0 0 1.4rem; }
summary { cursor: pointer; padding: .25rem 0; list-style-position: outside; border-bottom: 1px solid var(--rule); margin-bottom: .7rem; }
figure svg { display: block; width: 100%; height: auto; }
.provenance h3 { border-top: 1px solid var(--rule); font-size: 1rem; }
footer { font-size: .85rem; padding-top: 1rem; padding-bottom: 3rem; margin-top: 3rem; border-top: 1px solid var(--rule); }
@media print {
  body { font-size: 10.5pt; }
  main, footer { max-width: none; padding: 0; }
  details, figure, table { break-inside: avoid; }
  summary { list-style: none; }
  h3, h4, h5 { break-after: avoid; }
}
`;
