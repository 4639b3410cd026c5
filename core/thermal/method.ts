/**
 * Method version: any change in the numbers is a new one, with a line here; stored results keep theirs.
 * 1.0.0 layered cells, package star, films by correlation, multigrid.
 * 1.1.0 moving air: enhanced films, bodies in the stream, air warmed upstream in every rise and in the ladder; lands corrected
 *       for the cells around them; gaps between nets count wherever they fall; grid error from two grids.
 * 1.2.0 each land corrected, by a patch of fine cells, for what the board's cells misjudge around it.
 * 1.2.1 both grids of the grid error correct the same lands; turned lands meet the cells of unturned ones;
 *       films that radiation keeps from settling are damped.
 * 1.3.0 a compiled kernel solves the network: the same equations, other digits behind the tolerance; model error by heat path;
 *       the faces around a land that fills its cells are widened where its package cannot make up for them.
 */
export const methodVersion = '1.3.0';

/** Linear solution: ‖b − A·x‖ ÷ ‖b‖ asked of the final solve, and passed only with an energy balance below the limit. */
export const linearTolerance = 1e-9;
export const energyLimit = 1e-6;
/** The films are settled when no junction or cell moves more than this between two rounds, K. */
export const filmToleranceK = 0.003;
/** Rounds before the last reduce their residual by this factor. */
export const roundReduction = 0.03;
export const maximumFilmRounds = 60;
export const maximumIterations = 400;
