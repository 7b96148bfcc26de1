export { FIGURES } from '../core'
