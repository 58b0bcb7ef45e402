import { notFound } from '@/lib/request/problem';
import { route } from '@/lib/request/route';

// An address that is none answers like a thing that is not there: 401 signed out, 404 signed in, never a page.
export const GET = route({ access: 'viewer' }, () => Promise.reject(notFound()));
export const POST = route({ access: 'viewer' }, () => Promise.reject(notFound()));
export const PUT = route({ access: 'viewer' }, () => Promise.reject(notFound()));
export const PATCH = route({ access: 'viewer' }, () => Promise.reject(notFound()));
export const DELETE = route({ access: 'viewer' }, () => Promise.reject(notFound()));
