// The lazily loaded group of the calculators: the one kind of module that may re-export.
export { ToolScreen } from './tool-screen'
export { ToolsHome } from './tools-home'
export { AboutSources } from './about-sources'
