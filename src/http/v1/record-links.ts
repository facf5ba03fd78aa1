/** Link header of a record: its list, and the revisions right before and after it (RFC 5829). */
export function recordLinks(project: string, before: string | undefined, after: string | undefined): string {
  const link = (url: string, rel: string) => `<${url}>; rel="${rel}"`
  return [
    link(`/v1/projects/${project}/assessments`, 'collection'),
    ...(before ? [link(`/v1/assessments/${before}`, 'predecessor-version')] : []),
    ...(after ? [link(`/v1/assessments/${after}`, 'successor-version')] : []),
  ].join(', ')
}
