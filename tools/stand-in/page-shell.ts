import type { Response } from 'express';
import { html, Markup } from './html';

const style = `
:root { color-scheme: light dark; --paper: #fbfaf6; --board: #fff; --ink: #1e2529; --quiet: #535d63; --line: #d8d5ca;
  --spruce: #1f5a4c; --on-spruce: #fff; --slate: #465a7d; }
@media (prefers-color-scheme: dark) { :root { --paper: #14181a; --board: #1c2225; --ink: #e9ecea; --quiet: #a9b2b0;
  --line: #3a4347; --spruce: #7cc4af; --on-spruce: #14181a; --slate: #a9bce0; } }
* { box-sizing: border-box; }
body { margin: 0; background: var(--paper); color: var(--ink); font: 16px/1.5 'Source Sans 3', system-ui, sans-serif;
  font-variant-numeric: tabular-nums; }
header, main { max-width: 1200px; margin: 0 auto; padding: 16px; }
header { padding-bottom: 8px; border-bottom: 2px dashed var(--spruce); }
h1 { font-size: 24px; line-height: 32px; margin: 0; } h2 { font-size: 18px; margin: 32px 0 8px; }
p { margin: 8px 0; } .quiet { color: var(--quiet); }
a { color: var(--slate); } :focus-visible { outline: 3px solid var(--slate); outline-offset: 2px; }
.skip { position: absolute; left: -9999px; } .skip:focus { position: static; }
.acts { display: flex; flex-wrap: wrap; gap: 8px; align-items: center; margin: 8px 0; }
button { min-height: 44px; padding: 8px 16px; border: 1px solid var(--spruce); border-radius: 6px;
  background: var(--spruce); color: var(--on-spruce); font: inherit; font-weight: 600; cursor: pointer; }
button.plain { background: transparent; color: var(--spruce); }
td button { min-height: 32px; padding: 2px 8px; }
input { min-height: 44px; padding: 8px; border: 1px solid var(--quiet); border-radius: 6px; background: var(--board);
  color: var(--ink); font: inherit; }
.note { padding: 8px 16px; border: 1px solid var(--spruce); border-radius: 6px; background: var(--board); }
.figures { display: flex; flex-wrap: wrap; gap: 16px; margin: 8px 0; }
.figures > div { min-width: 160px; padding: 8px 16px; border: 1px solid var(--line); border-radius: 6px;
  background: var(--board); }
dt { color: var(--quiet); } dd { margin: 0; font-size: 20px; font-weight: 600; }
dl.rows { display: grid; grid-template-columns: max-content 1fr; gap: 4px 16px; } .rows dd { font-size: 16px;
  font-weight: 400; overflow-wrap: anywhere; }
.wide { overflow-x: auto; border: 1px solid var(--line); border-radius: 6px; background: var(--board); }
table { width: 100%; border-collapse: collapse; } caption { text-align: left; padding: 8px 16px; color: var(--quiet); }
th, td { padding: 8px 16px; text-align: left; vertical-align: top; border-top: 1px solid var(--line); }
th { font-weight: 600; } .number { text-align: right; white-space: nowrap; } td form { display: inline; }
code { font-size: 14px; overflow-wrap: anywhere; } pre { white-space: pre-wrap; overflow-wrap: anywhere; margin: 0;
  padding: 16px; border: 1px solid var(--line); border-radius: 6px; background: var(--board); font-size: 14px; }
iframe { width: 100%; height: 480px; border: 1px solid var(--line); border-radius: 6px; background: #fff; }
@media (max-width: 700px) { thead { position: absolute; left: -9999px; } table, caption, tbody, tr, td { display: block; }
  tr { padding: 8px 0; border-top: 1px solid var(--line); } td { display: flex; justify-content: space-between; gap: 16px;
  padding: 4px 16px; border: 0; } td::before { content: attr(data-label); color: var(--quiet); flex: none; }
  .number { white-space: normal; } td > * { min-width: 0; } }
@media print { .acts, td form { display: none; } }
`;

/** Sends a whole page: one style for all stand-ins, light and dark, with nothing fetched from elsewhere. */
export function sendPage(response: Response, title: string, content: Markup, status = 200): void {
  const page = html`<!doctype html>
    <html lang="en">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <title>${title}</title>
        <link rel="icon" href="data:," />
        <style>
          ${new Markup(style)}
        </style>
      </head>
      <body>
        <a class="skip" href="#content">Skip to content</a>
        ${content}
      </body>
    </html>`;
  response
    .status(status)
    .set('Cache-Control', 'no-store')
    .set('X-Content-Type-Options', 'nosniff')
    .set('Referrer-Policy', 'same-origin')
    .set(
      'Content-Security-Policy',
      "default-src 'none'; style-src 'unsafe-inline'; img-src 'self' data:; frame-src 'self'; base-uri 'none'; " +
        "frame-ancestors 'none'",
    )
    .type('html')
    .send(page.source);
}

/** One column of a table: its head, what stands in a cell, and whether it is a number. */
export interface Column<Row> {
  head: string;
  cell: (row: Row) => Markup | string | number;
  number?: boolean;
}

/** A captioned table that turns into cards on a phone; says `empty` when there are no rows. */
export function table<Row>(caption: string, columns: Column<Row>[], rows: Row[], empty: string): Markup {
  if (rows.length === 0) return html`<p class="quiet">${empty}</p>`;
  const numeric = (column: Column<Row>) => (column.number ? 'number' : '');
  return html`<div class="wide" role="region" aria-label="${caption}" tabindex="0">
    <table>
      <caption>
        ${caption}
      </caption>
      <thead>
        <tr>
          ${columns.map((column) => html`<th scope="col" class="${numeric(column)}">${column.head}</th>`)}
        </tr>
      </thead>
      <tbody>
        ${rows.map(
          (row) =>
            html`<tr>
              ${columns.map(
                (column) =>
                  html`<td class="${numeric(column)}" data-label="${column.head}">
                    <div>${column.cell(row)}</div>
                  </td>`,
              )}
            </tr>`,
        )}
      </tbody>
    </table>
  </div>`;
}
