package tunwarden.report.page;

/** The look of the page: black on white, greys for what is normal, red only for limits passed. */
final class Style {
  static final String SHEET =
      """
      @page { size: A4; margin: 15mm; }
      * { box-sizing: border-box; }
      body { font: 10.5pt/1.4 "Liberation Sans", Arial, sans-serif; color: #111;
        max-width: 190mm; margin: 8mm auto; padding: 0 4mm; }
      h1 { font-size: 17pt; margin: 0 0 1mm; } h2 { font-size: 12.5pt; margin: 7mm 0 2mm;
        border-bottom: 0.4mm solid #888; } h3 { font-size: 10.5pt; margin: 4mm 0 1mm; }
      p { margin: 1mm 0; } .lead p { font-size: 11.5pt; margin: 1.5mm 0; }
      .from { color: #444; margin: 0 0 4mm; }
      ul { margin: 1mm 0 1mm 5mm; padding: 0; } li { margin: 0.5mm 0; }
      table { border-collapse: collapse; width: 100%; font-size: 9pt; }
      th, td { text-align: left; vertical-align: top; padding: 0.6mm 2mm 0.6mm 0;
        border-bottom: 0.2mm solid #ccc; } td.n, th.n { text-align: right; white-space: nowrap; }
      td.t { white-space: nowrap; } tr, figure, .piece { break-inside: avoid; }
      h2, h3, h2 + p { break-after: avoid; } h1.chapter { break-before: page; }
      figure { margin: 2mm 0; }
      figcaption { font-size: 9pt; color: #444; }
      .caution { break-inside: avoid; border: 0.5mm solid #111; padding: 1mm 3mm; margin: 2mm 0; }
      code { font-size: 8.5pt; overflow-wrap: anywhere; }
      .columns { display: grid; grid-template-columns: 1fr 1fr; gap: 4mm; }
      svg { width: 100%; height: auto; display: block; }
      .frame { fill: none; stroke: #888; } .grid { stroke: #e4e4e4; }
      text { font: 11.5px "Liberation Sans", Arial, sans-serif; fill: #222; }
      .tick { fill: #555; } .second { fill: #9a5b00; } .axis { font-weight: bold; }
      .level { font-size: 10.5px; fill: #333; } .number { font-size: 9px; fill: #333; }
      .pressure { fill: none; stroke: #111; stroke-width: 1.6; }
      .span { fill: none; stroke: #111; stroke-width: 1; }
      .other { fill: none; stroke: #1f5fa8; stroke-width: 1.6; stroke-dasharray: 6 3; }
      .temperature { fill: none; stroke: #c77700; stroke-width: 1.3; }
      .equilibrium { fill: none; stroke: #777; stroke-width: 1.2; stroke-dasharray: 5 3; }
      .band { fill: #9dbfe3; fill-opacity: 0.55; stroke: none; }
      .dissolved { fill: none; stroke: #1f5fa8; stroke-width: 1.6; }
      .limit { stroke: #b00020; stroke-width: 1.2; }
      .early { stroke: #b00020; stroke-width: 1; stroke-dasharray: 4 3; }
      .plain { stroke: #777; stroke-width: 1; stroke-dasharray: 2 3; }
      .moment { stroke: #1f5fa8; stroke-width: 1.2; stroke-dasharray: 3 3; }
      .gas { fill: #111; } .signal { fill: #b00020; fill-opacity: 0.8; }
      .heat { fill: #c77700; } .note { fill: #777; }
      """;

  private Style() {}
}
