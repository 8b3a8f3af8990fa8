import './app/boot/jitless';
import './app/tokens.css';
import './app/base.css';
import { boot } from './app/boot/boot';
import { views } from './views/registry';

void boot(views);
