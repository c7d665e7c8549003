/** Markup of the report, in which everything that came from a file is escaped where it is made. */
export function Drawn({ html, class: name }: { readonly html: string; readonly class?: string }) {
  // biome-ignore lint/security/noDangerouslySetInnerHtml: made by the report's own escaping template, and no script may run
  return <div class={name} dangerouslySetInnerHTML={{ __html: html }} />;
}
