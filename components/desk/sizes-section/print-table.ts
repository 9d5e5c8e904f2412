import { render, type TemplateResult } from 'lit';

const style = `
  @page { margin: 14mm; }
  body { font: 9pt/1.35 "Noto Sans", "DejaVu Sans", "Helvetica Neue", sans-serif; color: #000; font-variant-numeric: tabular-nums; }
  h1 { font-size: 12pt; margin: 0 0 2pt; }
  p { margin: 0 0 6pt; }
  table { border-collapse: collapse; width: 100%; }
  caption { text-align: start; padding-bottom: 4pt; }
  th, td { font-weight: 400; text-align: start; padding: 2pt 6pt 2pt 0; border-bottom: 0.4pt solid #999; vertical-align: baseline; }
  .number { text-align: end; }
  thead { display: table-header-group; }
  tr { break-inside: avoid; }
  .unseen { display: none; }
  footer { margin-top: 10pt; font-size: 8pt; }
  * { color: #000 !important; }
`;

/** Prints a sheet of its own, in black on white, without the page around it. */
export function printSheet(title: string, content: TemplateResult): void {
  const frame = document.createElement('iframe');
  frame.style.cssText = 'position:fixed;width:0;height:0;border:0';
  frame.setAttribute('aria-hidden', 'true');
  document.body.append(frame);
  const sheet = frame.contentDocument;
  const view = frame.contentWindow;
  if (!sheet || !view) {
    frame.remove();
    return;
  }
  sheet.title = title;
  const look = sheet.createElement('style');
  look.textContent = style;
  sheet.head.append(look);
  render(content, sheet.body);
  view.addEventListener('afterprint', () => frame.remove());
  view.print();
}
