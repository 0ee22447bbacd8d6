import * as Comlink from 'comlink';
import { Analysis } from './analysis';

Comlink.expose(new Analysis());
