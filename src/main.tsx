import { createRoot } from 'react-dom/client'
import { App } from './app/providers'
import { applyTheme, readTheme } from './lib/theme'
import './styles.css'

applyTheme(readTheme())
const root = document.getElementById('root')
if (!root) throw new Error('index.html has no #root')
createRoot(root).render(<App />)
