import { bootstrapApplication } from '@angular/platform-browser';
import { config } from 'zod/v4/core';
import { App } from './app/app';
import { appConfig } from './app/app.config';

// The content security policy forbids code made from text; schemas in the lazy parts of the app must not even try.
config({ jitless: true });

bootstrapApplication(App, appConfig).catch((error: unknown) => console.error(error));
