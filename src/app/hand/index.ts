import './hand.css'

export { HandPanel } from './HandPanel'
export { HandVerbs } from './HandVerbs'
export { StrokeForm } from './StrokeForm'
