import { createMemoryStore } from '../../../src/edge/store/memory.ts';
import { testStatePort } from '../../contracts/state-port.ts';

testStatePort('the memory of the process', createMemoryStore);
