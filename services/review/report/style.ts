/** Prints on white paper in black; colour only repeats what a word says. */
export const STYLE = `
:root { font: 15px/1.45 system-ui, sans-serif; color: #1a1a1a; background: #fff; }
body { max-width: 70rem; margin: 2rem auto; padding: 0 1rem; }
h1 { font-size: 1.6rem; margin: 0 0 1rem; }
h2 { font-size: 1.15rem; margin: 2rem 0 .5rem; }
dl { display: grid; gap: .2rem; margin: 0; }
dl div { display: grid; grid-template-columns: 8rem 1fr; }
dt { color: #555; }
dd { margin: 0; overflow-wrap: anywhere; }
.verdict { border-left: .4rem solid #555; padding: .6rem 1rem; background: #f4f4f4; }
.verdict strong { text-transform: uppercase; margin-right: .6rem; }
.verdict.pass { border-color: #1b7f3b; }
.verdict.caution { border-color: #b26a00; }
.verdict.fail { border-color: #b3261e; }
table { border-collapse: collapse; width: 100%; font-size: .88rem; }
th, td { text-align: left; vertical-align: top; padding: .3rem .6rem .3rem 0; border-bottom: 1px solid #d8d8d8; overflow-wrap: break-word; }
th { white-space: nowrap; }
thead { display: table-header-group; }
tr, .signature { break-inside: avoid; }
.signature div { display: grid; grid-template-columns: repeat(2, 1fr); gap: 1rem 2rem; }
.signature div p { border-top: 1px solid #1a1a1a; margin: 2.5rem 0 0; padding-top: .2rem; font-size: .88rem; }
@media print { body { max-width: none; margin: 0; } h2 { break-after: avoid; } }
`;
