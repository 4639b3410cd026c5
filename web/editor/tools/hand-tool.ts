import { panned } from '../camera.ts';
import { idle } from './gesture.ts';
import type { Tool } from './tool.ts';

/** Moves the picture; also behind the middle button and the space bar of every other tool. */
export const handTool: Tool = {
  press: (store, input) => store.setState({ gesture: { phase: 'panning', last: input.screen } }),
  move(store, input) {
    const { gesture, camera } = store.getState();
    if (gesture.phase !== 'panning') return;
    const [dx, dy] = [input.screen[0] - gesture.last[0], input.screen[1] - gesture.last[1]];
    store.setState({ camera: panned(camera, dx, dy), gesture: { phase: 'panning', last: input.screen } });
  },
  release: (store) => store.setState({ gesture: idle }),
};
