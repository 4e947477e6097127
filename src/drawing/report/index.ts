export { constructionPages } from './construction-pages'
export { drawingPage } from './drawing-page'
export {
  type ModuleMatrix,
  type Page,
  type Paper,
  paperOf,
  type ReportOptions,
  type SectionName,
} from './page'
export { pageSvg } from './page-svg'
export { reportPages } from './report-pages'
