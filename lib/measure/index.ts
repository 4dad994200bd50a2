export { LENGTH_UNITS, MAX_LENGTH_IN, roundLength, toInches, type LengthUnit } from './units'
export { parseLength, type ParsedLength } from './parse-length'
export { echoLength, formatLength, type LengthStyle } from './format-length'
