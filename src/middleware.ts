import { defineMiddleware } from 'astro:middleware';

export const onRequest = defineMiddleware((context, next) => next());
