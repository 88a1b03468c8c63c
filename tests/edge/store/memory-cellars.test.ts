import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { testCellarStore } from '../../contracts/cellar-store.ts';

testCellarStore('the memory of the process', async (now) => createMemoryCellars({ now }), { anyLogs: 150 });
