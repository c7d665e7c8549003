/**
 * Colours and strokes of the charts. Tones differ in lightness as well as in hue, textures and dashes tell them apart in
 * black and white. A page that shows charts defines the custom properties for light and dark.
 */
export const chartStyle = `
.chart{display:block;width:100%;height:auto;font:10.5px var(--sans);font-variant-numeric:tabular-nums}
.chart text{fill:var(--ink2)}
.chart .end{text-anchor:end}.chart .mid{text-anchor:middle}
.chart .unit{fill:var(--ink);font-weight:600}
.chart .said{fill:var(--ink)}
.chart .on-dark{fill:#fff}.chart .on-light{fill:#000}
.chart .halo{fill:var(--ink);font-weight:600;paint-order:stroke;stroke:var(--paper);stroke-width:3px;stroke-linejoin:round}
.grid{stroke:var(--rule);fill:none;stroke-width:.7}
.axis,.mark,.edge{stroke:var(--ink2);fill:none;stroke-width:.8}
.mark{stroke-dasharray:2 2}.edge{stroke-dasharray:5 3}
.contour{stroke:var(--ink);fill:none;stroke-width:.9}
.dots{stroke:var(--t3);stroke-width:5;stroke-linecap:round;fill:none}
.fill{stroke:var(--paper);stroke-width:.4}
.texture{stroke:var(--paper);stroke-width:1.3;fill:none}
.outline{fill:var(--paper);stroke-width:1.6}
.fill.t1{fill:var(--t1)}.fill.t2{fill:var(--t2)}.fill.t3{fill:var(--t3)}.fill.t4{fill:var(--t4)}.fill.t5{fill:var(--t5)}.fill.t6{fill:var(--t6)}
.outline.t1{stroke:var(--t1)}.outline.t3{stroke:var(--t3)}.outline.t5{stroke:var(--t5)}
.line{fill:none;stroke-width:1.8;stroke-linejoin:round}
.l1{stroke:var(--t1)}.l2{stroke:var(--t3);stroke-dasharray:6 3}.l3{stroke:var(--ink);stroke-width:1.2}.l4{stroke:var(--t4);stroke-dasharray:2 2}
.shade{fill:var(--t1)}.d1{fill-opacity:.1}.d2{fill-opacity:.24}.d3{fill-opacity:.4}.d4{fill-opacity:.56}.d5{fill-opacity:.74}.d6{fill-opacity:.92}
.box{fill:var(--t2);stroke:var(--ink2);stroke-width:.8}.median{stroke:var(--ink);stroke-width:2.2;fill:none}
.pixels{image-rendering:pixelated}
.strip{display:block;width:100%;height:auto}
.sample{width:1.5em;height:1em;vertical-align:-.12em}
`;
