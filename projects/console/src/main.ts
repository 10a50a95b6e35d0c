import { bootstrapApplication } from '@angular/platform-browser';
import { App } from './app/app';
import { appConfig } from './app/app.config';
import { applyStoredScheme } from './app/core/shell/scheme';

applyStoredScheme();
bootstrapApplication(App, appConfig).catch((error: unknown) => console.error(error));
