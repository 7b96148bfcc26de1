export { serveWindow, type Served } from './server'
