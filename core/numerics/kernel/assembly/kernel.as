export { setHierarchy, buildLevels, refreshLevels } from './cycle';
export { setMatrix, addConductances, multiply, dot, precondition, answerDot, turn, step, residual } from './iterate';
