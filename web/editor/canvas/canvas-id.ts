/** Id of the element that takes the keys of the canvas. */
export const canvasId = 'board-canvas';
