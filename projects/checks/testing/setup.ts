import { setupZonelessTestEnv } from 'jest-preset-angular/setup-env/zoneless';

setupZonelessTestEnv();

// jsdom lays nothing out, so there is nothing to scroll to.
Element.prototype.scrollIntoView = () => undefined;
