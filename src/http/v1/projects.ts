import type { FastifyInstance } from 'fastify'
import { getProject, listProjects, projectList } from '../../operations/list-projects.ts'
import type { Office } from '../../operations/office.ts'
import { putProject } from '../../operations/put-project.ts'
import { sendTagged, tagsOf } from '../conditional.ts'
import { askedPage, pageOf, paging } from '../pages.ts'
import { readQuery } from '../query.ts'

type Slug = { Params: { slug: string } }

/** Projects: made and renamed by PUT, read one by one and as a list. */
export function projects(app: FastifyInstance, office: Office): void {
  app.get('/v1/projects', async (request, reply) => {
    const { limit, page } = askedPage<string>(projectList, readQuery(request, paging))
    const rows = await listProjects(office, request.actor!, page)
    return pageOf(request, reply, projectList, rows, limit, (row) => row.slug)
  })
  app.get<Slug>('/v1/projects/:slug', async (request, reply) => {
    const { tag, project } = await getProject(office, request.actor!, request.params.slug)
    return sendTagged(request, reply, tag, () => JSON.stringify(project))
  })
  app.put<Slug>('/v1/projects/:slug', async (request, reply) => {
    const { slug } = request.params
    const given = {
      ifMatch: tagsOf(request.headers['if-match']),
      ifNoneMatch: tagsOf(request.headers['if-none-match']),
    }
    const { created, tag, project } = await putProject(office, request.actor!, slug, request.body, given)
    if (created) reply.code(201).header('location', `/v1/projects/${slug}`)
    return reply.header('etag', `"${tag}"`).type('application/json; charset=utf-8').send(JSON.stringify(project))
  })
}
