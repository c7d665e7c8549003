import { barStrip } from '../charts/barStrip.ts';
import { type Markup, markup } from '../charts/markup.ts';
import type { Look } from '../charts/texture.ts';
import { warningText } from '../language/warningWords.ts';
import { clientSentences } from './clientSentences.ts';
import { breakEvenSentence } from './comparisonTables.ts';
import { dataTable, figureColumns } from './dataTable.ts';
import { named } from './named.ts';
import type { ReportInput } from './reportInput.ts';
import { FLOW_CHANGE, PRICE_CHANGE, ROOM_CHANGE, whatIf } from './whatIf.ts';

const HEAT_PUMP: Look = { tone: 1, texture: 'plain' };
const BOILER: Look = { tone: 3, texture: 'outline' };
/** So many warnings stand on the first page; all of them stand in the part for the auditor. */
const MOST_WARNINGS = 4;

/** The first page: what the client wants to know, what to beware of, and where to sign. */
export function clientPage(input: ReportInput): Markup {
  const { words, document } = input;
  const { client: said } = words;
  const sentences = clientSentences(input).map((sentence) => markup`<p class="answer">${named(sentence)}</p>`);
  return markup`<section class="sheet" aria-labelledby="answer"><h2 id="answer">${said.title}</h2>${sentences}${keyFigures(input)}<div class="pair"><div><h3>${said.costTitle}</h3>${costBars(input)}</div><div><h3>${said.changesTitle}</h3>${changes(input)}</div></div><div class="pair"><div>${cautions(input)}</div><div><h3>${said.notTitle}</h3><ul>${said.not.map((line) => markup`<li>${line}</li>`)}</ul></div></div>${signature(input)}<p class="rests">${said.rests} ${named(document.heatPumpUnit)}.</p></section>`;
}

function keyFigures({ document, words, figures }: ReportInput): Markup {
  const { annual, costs, carbon } = document;
  const { client: said } = words;
  const [first] = costs;
  const tiles: [string, string, string][] = [
    [said.tiles.electricity, figures.number(annual.electricity.total, 0), 'kWh'],
    [said.tiles.factor, figures.factor(annual.seasonalFactor.h4), 'H4'],
  ];
  if (first !== undefined) tiles.push([said.tiles.cost, figures.number(first.systemTotal, 0), first.currency]);
  if (first?.saving !== undefined) {
    const name = first.saving < 0 ? said.tiles.dearer : said.tiles.saved;
    tiles.push([name, figures.number(Math.abs(first.saving), 0), first.currency]);
  }
  if (typeof carbon.heatPump === 'number')
    tiles.push([said.tiles.carbon, figures.number(carbon.heatPump, 0), 'kg CO₂']);
  const entries = tiles.map(
    ([name, value, unit]) => markup`<div><dt>${name}</dt><dd>${value} <small>${unit}</small></dd></div>`,
  );
  return markup`<dl class="tiles">${entries}</dl>`;
}

/** Cost of a year on each tariff beside the boiler's, a bar each; the boiler's on the first tariff. */
function costBars({ document, words, figures }: ReportInput): Markup {
  const { client: said } = words;
  const { costs, boiler, currency } = document;
  const bars = costs.map((cost) => ({
    ...{ name: named(cost.tariff), value: cost.systemTotal, currency: cost.currency, look: HEAT_PUMP },
  }));
  if (boiler !== undefined) bars.push({ name: markup`${said.boiler}`, value: boiler.total, currency, look: BOILER });
  if (bars.length === 0) return markup`<p>${words.costs.none}</p>`;
  const values = bars.map(({ value }) => value);
  const range = [Math.min(0, ...values), Math.max(0, ...values)] as const;
  const items = bars.map(
    ({ name, value, currency: money, look }) =>
      markup`<li><span class="name">${name}</span><span class="figure">${figures.money(value, money)}</span>${barStrip(value, range, look)}</li>`,
  );
  return markup`<ul class="bars">${items}</ul><p class="small">${said.costNote}</p>`;
}

function changes(input: ReportInput): Markup {
  const { answer, document, words, figures } = input;
  const { client: said } = words;
  const list = whatIf(answer);
  if (list.length === 0) return markup`<p>${said.nothingChanges}</p>`;
  const names = {
    electricity: said.changes.electricity(figures.percent(PRICE_CHANGE)),
    fuel: said.changes.fuel(figures.percent(PRICE_CHANGE)),
    flow: said.changes.flow(figures.number(FLOW_CHANGE, 0)),
    rooms: said.changes.rooms(figures.number(ROOM_CHANGE, 0)),
  };
  const [first] = document.costs;
  if (first === undefined) {
    return dataTable({
      caption: said.changesCaptionEnergy,
      columns: figureColumns(said.change, ['kWh']),
      rows: list.map(({ kind, electricity }) => [names[kind], figures.signed(electricity, 0)]),
    });
  }
  const saving = first.saving !== undefined;
  const table = dataTable({
    caption: said.changesCaption(first.currency),
    columns: figureColumns(said.change, [said.heatingCost, ...(saving ? [said.saving] : [])]),
    rows: list.map(({ kind, cost = 0, saving: less = 0 }) => [
      names[kind],
      figures.signed(cost, 0),
      ...(saving ? [figures.signed(less, 0)] : []),
    ]),
  });
  return markup`${table}<p class="small">${breakEvenSentence(document, words, figures)}</p>`;
}

function cautions({ answer, words, messages, figures }: ReportInput): Markup {
  const { client: said } = words;
  const { warnings } = answer;
  if (warnings.length === 0) return markup`<h3>${said.warningsTitle}</h3><p>${said.noWarnings}</p>`;
  const items = warnings.slice(0, MOST_WARNINGS).map((warning) => {
    const { text, remedy } = warningText(warning, messages.warnings, messages.problems);
    return markup`<li>${named(text)} <em>${named(remedy)}</em></li>`;
  });
  const rest = warnings.length - items.length;
  const more = rest > 0 ? markup`<p class="small">${said.moreWarnings(figures.number(rest, 0))}</p>` : undefined;
  return markup`<h3>${said.warningsTitle}</h3><ul>${items}</ul>${more}`;
}

function signature({ words, date }: ReportInput): Markup {
  const { client: said } = words;
  const day = date === undefined ? undefined : named(date);
  return markup`<div class="signature"><p><span class="line">${day}</span>${said.date}</p><p><span class="line"></span>${said.assessor}</p><p><span class="line"></span>${said.client}</p></div>`;
}
