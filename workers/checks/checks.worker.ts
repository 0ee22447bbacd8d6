import * as Comlink from 'comlink';
import { Checks } from './checks';

Comlink.expose(new Checks());
