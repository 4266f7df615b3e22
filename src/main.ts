import './assets/base.css'
import { VueQueryPlugin } from '@tanstack/vue-query'
import { createPinia } from 'pinia'
import { createApp } from 'vue'
import { queryClient } from './api/queryClient.ts'
import App from './App.vue'
import { createAppRouter } from './router/index.ts'

const app = createApp(App)

app.use(createPinia())
app.use(VueQueryPlugin, { queryClient })
app.use(createAppRouter())

app.mount('#app')
