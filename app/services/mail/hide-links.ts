/** The text with its one-time links cut short, for mails that have left: only the person they went to may follow them. */
export function hideLinks(body: string): string {
  return body.replace(/\/(welcome|new-password)\/[\w-]+/g, "/$1/…");
}
