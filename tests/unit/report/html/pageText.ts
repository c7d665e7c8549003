/** What a page asks of anywhere: addresses, imports, sources that are not in the page itself. */
export function requestsIn(page: string): string[] {
  const own = page.replace(/(?:href|src)="data:image\/png;base64,[A-Za-z0-9+/=]*"/g, '');
  return [
    ...(own.match(/https?:|\/\/|url\(|@import|@font-face/gi) ?? []),
    ...(own.match(/<(?:link|iframe|object|embed|base|form|audio|video|source|img)\b[^>]*/gi) ?? []),
    ...(own.match(/\ssrc=[^ >]*/gi) ?? []),
    ...(own.match(/\shref="(?!#)[^"]*"/gi) ?? []),
    ...(own.match(/<script(?! type="application\/json" )[^>]*>/gi) ?? []),
    ...(own.match(/\son[a-z]+="/gi) ?? []),
  ];
}

/** Text of a page as it is read, without what is data or style. */
export function readText(page: string): string {
  return page.replace(/<(style|script)[^>]*>[\s\S]*?<\/\1>/g, '').replace(/<[^>]*>/g, ' ');
}
