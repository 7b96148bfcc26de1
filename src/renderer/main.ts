import { createApp as createVue } from 'vue'
import App from './App.vue'
import { findHost } from './host'
import { createApp } from './state/app'
import './style/theme.css'
import './style/window.css'
import './style/brief.css'
import './style/shortlist.css'
import './style/panes.css'
import './style/plots.css'
import './style/shapes.css'
import './style/wing.css'

const worker = new Worker(new URL('./worker/desk.worker.ts', import.meta.url), { type: 'module' })
createVue(App, { app: createApp(findHost(), worker) }).mount('#app')
