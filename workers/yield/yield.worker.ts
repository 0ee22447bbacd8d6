import * as Comlink from 'comlink';
import { Yield } from './yield';

Comlink.expose(new Yield());
