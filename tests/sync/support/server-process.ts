/** The whole server in a process of its own, without pages: started by the test of sudden death, which kills it. */
import { readConfig } from '@server/config'
import { startServer } from '@server/index'

const server = await startServer(readConfig(process.env), {
  client: () => Promise.resolve((_request, response) => response.end()),
})
process.send?.({ port: server.port, url: server.url })
