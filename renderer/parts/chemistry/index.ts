export { Configuration, ConfigurationLabel } from './Configuration';
export { Formula } from './Formula';
export { multiplicityName, parseTermLabel, spokenTerm, type TermLabel } from './termLabel';
export { TermSymbol } from './TermSymbol';
export { TermText } from './TermText';
