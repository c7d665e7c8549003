/** Markup of the report, in which everything that came from a file is escaped where it is made. */
export function Drawn({ html, class: name }: { readonly html: string; readonly class?: string }) {
  return <div class={name} dangerouslySetInnerHTML={{ __html: html }} />;
}
