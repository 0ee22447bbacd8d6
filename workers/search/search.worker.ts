import * as Comlink from 'comlink';
import { Search } from './search';

Comlink.expose(new Search());
