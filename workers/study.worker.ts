import { expose } from 'comlink';
import { studyService } from './studyService.ts';

expose(studyService());
