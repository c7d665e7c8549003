import { chartStyle } from '../charts/chartStyle.ts';

/** Ink, paper and the tones of the charts, by day and by night. */
const day = `
--paper:#fdfcf9;--sheet:#fff;--ink:#1b2228;--ink2:#4a545c;--rule:#d9d5cb;--accent:#155e63;
--t1:#1f5c7a;--t2:#7fb2c9;--t3:#b3541e;--t4:#9c8f2e;--t5:#a7a39a;--t6:#bcd0d6;
`;
const night = `
--paper:#14191d;--sheet:#1a2025;--ink:#e9e6df;--ink2:#b3b9bd;--rule:#3a4248;--accent:#7cc4c4;
--t1:#6db3d6;--t2:#2f6a86;--t3:#e58d52;--t4:#cfc162;--t5:#767b7c;--t6:#33505a;
`;

/** The look of a report: on a screen, on a phone, by day and by night, and on A4. */
export const pageStyle = `
:root{${day}--sans:system-ui,-apple-system,"Segoe UI",Roboto,"Noto Sans",sans-serif;--serif:Charter,"Bitstream Charter","Iowan Old Style",Cambria,Georgia,serif}
@media screen and (prefers-color-scheme:dark){:root{${night}}}
*{box-sizing:border-box}
html{-webkit-text-size-adjust:100%;print-color-adjust:exact;-webkit-print-color-adjust:exact}
body{margin:0;background:var(--paper);color:var(--ink);font:1rem/1.5 var(--sans);overflow-wrap:anywhere}
header,main,footer{max-width:62rem;margin:0 auto;padding:0 1.25rem}
header{padding-top:1.75rem}
h1,h2,h3,h4{line-height:1.2;margin:0 0 .5rem;text-wrap:balance}
h1{font:600 1.9rem/1.15 var(--serif)}
h2{font:600 1.45rem/1.2 var(--serif)}
h3{font-size:1.05rem;margin-top:1.6rem;padding-bottom:.3rem;border-bottom:1px solid var(--rule)}
h4{font-size:.95rem}
p,ul,dl,pre{margin:0 0 .7rem}
ul{padding-left:1.15rem}li{margin-bottom:.25rem}
a{color:var(--accent)}
:focus-visible{outline:2px solid var(--accent);outline-offset:2px}
.skip{position:absolute;left:-99rem}.skip:focus{left:1rem;top:.5rem;background:var(--paper);padding:.3rem .6rem}
.kicker{color:var(--accent);font-weight:600;letter-spacing:.02em;margin-bottom:.35rem}
.note{color:var(--ink2);max-width:46rem}
nav{font-size:.9rem}nav a{margin-right:1rem}
.sheet{margin-top:1.1rem;padding:1.25rem 1.4rem 1rem;background:var(--sheet);border:1px solid var(--rule);border-top:3px double var(--ink2)}
.answer{font:1.18rem/1.45 var(--serif);max-width:52rem;margin-bottom:.45rem}
.tiles{display:grid;grid-template-columns:repeat(auto-fit,minmax(8.5rem,1fr));gap:0 1.4rem;margin:1rem 0 .4rem}
.tiles div{display:flex;flex-direction:column;justify-content:space-between;border-top:2px solid var(--ink);padding-top:.35rem;margin-bottom:.7rem}
dt{font-size:.82rem;color:var(--ink2);line-height:1.3}
dd{margin:0;font:600 1.55rem/1.25 var(--serif);font-variant-numeric:tabular-nums;white-space:nowrap}
dd small{font:400 .8rem var(--sans);color:var(--ink2)}
.pair{display:grid;grid-template-columns:repeat(auto-fit,minmax(min(100%,21rem),1fr));gap:0 2rem}
.pair>*{min-width:0}.pair table{min-width:100%}
.bars{list-style:none;padding:0}
.bars li{display:grid;grid-template-columns:1fr auto;gap:0 .8rem;margin-bottom:.55rem}
.bars .figure{font-weight:600;font-variant-numeric:tabular-nums;white-space:nowrap}
.bars .strip{grid-column:1/-1}
.small,.rests,figcaption{font-size:.87rem;color:var(--ink2)}
.rests{margin:.4rem 0 0}
.signature{display:grid;grid-template-columns:repeat(auto-fit,minmax(11rem,1fr));gap:0 1.6rem;margin-top:1.2rem;font-size:.85rem;color:var(--ink2)}
.signature .line{display:block;height:2.4rem;margin-bottom:.25rem;border-bottom:1px solid var(--ink);color:var(--ink);padding-top:.9rem}
.part{margin-top:2.6rem;padding-top:1rem;border-top:3px double var(--ink2)}
.charts{display:grid;grid-template-columns:repeat(auto-fit,minmax(min(100%,21rem),1fr));gap:1.4rem 2rem;margin:1rem 0}
.charts>*{min-width:0;max-width:36rem}
figure{margin:0}
figcaption{margin-top:.35rem}
.key{list-style:none;padding:0;margin:.3rem 0;font-size:.85rem;display:flex;flex-wrap:wrap;gap:.1rem 1rem}
details{margin:.45rem 0;font-size:.87rem}
summary{cursor:pointer;color:var(--accent)}
.wide{overflow-x:auto;margin:.7rem 0 1rem}
table{border-collapse:collapse;font-size:.87rem;font-variant-numeric:tabular-nums;min-width:min(100%,34rem)}
caption{text-align:left;color:var(--ink2);padding-bottom:.3rem}
th,td{padding:.22rem .9rem .22rem 0;text-align:left;vertical-align:top;font-weight:400;border-bottom:1px solid var(--rule);overflow-wrap:break-word}
th:last-child,td:last-child{padding-right:0}
thead th{font-weight:600;border-bottom:1.5px solid var(--ink2);vertical-align:bottom}
.n{text-align:right}td.n{white-space:nowrap}
.sum>*{font-weight:600;border-top:1.5px solid var(--ink2)}
.gap{color:var(--ink2)}
pre{overflow-x:auto;white-space:pre-wrap;font-size:.8rem;line-height:1.4;padding:.6rem .7rem;border:1px solid var(--rule)}
code{font-size:.85em}th code{overflow-wrap:normal}
footer{padding-top:2rem;padding-bottom:2rem;font-size:.85rem;color:var(--ink2)}
${chartStyle}
@media screen and (max-width:32rem){header,main,footer{padding:0 1rem}h1{font-size:1.5rem}.sheet{padding:1rem .9rem}.tiles{grid-template-columns:1fr 1fr}.answer{font-size:1.08rem}}
@page{size:A4;margin:14mm 15mm}
@media print{
html{font-size:9.2pt}
body{background:none;line-height:1.38}
header,main,footer{max-width:none;padding:0}
nav,.skip,details:not(.printed){display:none}
h1{font-size:17pt}h2{font-size:13.5pt}h3{margin-top:9pt;break-after:avoid}h4{break-after:avoid}
.note{margin-bottom:0}
.sheet{border:0;border-top:3px double var(--ink2);padding:8pt 0 0;margin-top:6pt}
.answer{font-size:11pt;line-height:1.4}
dd{font-size:15pt}
.pair,.charts{grid-template-columns:1fr 1fr;gap:6pt 18pt}
.tiles{grid-template-columns:repeat(5,1fr)}
.signature{grid-template-columns:repeat(3,1fr);margin-top:6pt}
.part{break-before:page;border:0;margin:0;padding:0}
figure,tr,.bars li,.signature{break-inside:avoid}
.wide{overflow:visible}
table{font-size:8pt;min-width:60%}.pair table{min-width:100%}
th,td,th code{overflow-wrap:anywhere}
pre{font-size:7.5pt}
details.printed::details-content{content-visibility:visible;display:block;block-size:auto}
a{color:inherit;text-decoration:none}
}
`;
