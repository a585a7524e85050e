/** Every route of the API: who may call it, what it takes and what it answers. */
import { bundleRequestSchema } from '@shared/api/bundle';
import {
  commissionChangesSchema,
  commissionFilterSchema,
  commissionListSchema,
  commissionSchema,
  newCommissionSchema,
} from '@shared/api/commission';
import { editSavedSchema, editSchema, openLayoutSchema } from '@shared/api/layout';
import { liveQuerySchema, whereaboutsSchema } from '@shared/api/live';
import { PICTURE_BOUNDS, PICTURE_FIELD } from '@shared/api/picture';
import { sessionSchema, signInSchema } from '@shared/api/session';
import {
  keepVersionSchema,
  restoreVersionSchema,
  versionDetailSchema,
  versionKeptSchema,
  versionListSchema,
} from '@shared/api/version';
import type { RouteDeclaration } from './http/route';

const SEE = { anyOf: ['see-commissions'] } as const;
const LAYOUT_FILE = { status: 200, file: 'application/json' } as const;

export const API_ROUTES = {
  whoIsSignedIn: {
    method: 'get',
    path: '/session',
    summary: 'Who is signed in; hands the browser the token that every change must bring',
    access: 'anyone',
    answer: { status: 200, schema: sessionSchema },
    refusals: [],
  },
  signIn: {
    method: 'post',
    path: '/session',
    summary: 'Sign in',
    access: 'anyone',
    body: signInSchema,
    answer: { status: 200, schema: sessionSchema },
    refusals: ['wrong-credentials', 'too-many-requests'],
  },
  signOut: {
    method: 'delete',
    path: '/session',
    summary: 'Sign out; the session ends on the server',
    access: 'anyone',
    answer: { status: 204 },
    refusals: [],
  },
  listCommissions: {
    method: 'get',
    path: '/commissions',
    summary: 'The commissions of the workshop, those touched last first',
    access: SEE,
    query: commissionFilterSchema,
    answer: { status: 200, schema: commissionListSchema },
    refusals: [],
  },
  createCommission: {
    method: 'post',
    path: '/commissions',
    summary: 'A new commission with its layout: the starting layout, or one from a layout file',
    access: { anyOf: ['edit-commissions'] },
    body: newCommissionSchema,
    bodyLimit: 'layout',
    answer: { status: 201, schema: commissionSchema },
    refusals: [],
  },
  readCommission: {
    method: 'get',
    path: '/commissions/:id',
    summary: 'One commission',
    access: SEE,
    answer: { status: 200, schema: commissionSchema },
    refusals: [],
  },
  changeCommission: {
    method: 'patch',
    path: '/commissions/:id',
    summary: 'Change title, client, due date or stage; put into the archive or take out',
    access: { anyOf: ['edit-commissions'] },
    body: commissionChangesSchema,
    answer: { status: 200, schema: commissionSchema },
    refusals: [],
  },
  openLayout: {
    method: 'get',
    path: '/layouts/:id',
    summary: 'The draft of a layout with its revision',
    access: SEE,
    answer: { status: 200, schema: openLayoutSchema },
    refusals: [],
  },
  editLayout: {
    method: 'patch',
    path: '/layouts/:id',
    summary:
      'Save an edit; edits made elsewhere since its base revision merge unless both touch a place',
    access: { anyOf: ['edit-pattern', 'edit-joint'] },
    body: editSchema,
    bodyLimit: 'layout',
    answer: { status: 200, schema: editSavedSchema },
    refusals: ['conflict'],
  },
  downloadLayout: {
    method: 'get',
    path: '/layouts/:id/file',
    summary: 'The draft as a layout file',
    access: SEE,
    answer: LAYOUT_FILE,
    refusals: [],
  },
  watchLayout: {
    method: 'get',
    path: '/layouts/:id/events',
    summary: "The layout's edits as they are saved, and who is here (Last-Event-ID resumes)",
    access: SEE,
    query: liveQuerySchema,
    answer: { status: 200, stream: 'text/event-stream' },
    refusals: [],
  },
  tellWhereabouts: {
    method: 'post',
    path: '/layouts/:id/here',
    summary: 'Say where one is in a layout',
    access: SEE,
    body: whereaboutsSchema,
    answer: { status: 204 },
    refusals: [],
  },
  preparePicture: {
    method: 'post',
    path: '/pictures/prepared',
    summary:
      'A PNG, JPEG or WebP picture made ready to be laid as tiles: upright, without metadata, at most 1024 px a side, as PNG; nothing of it is kept',
    access: { anyOf: ['edit-pattern'] },
    upload: { field: PICTURE_FIELD, most: PICTURE_BOUNDS.bytes },
    answer: { status: 200, file: 'image/png' },
    refusals: ['too-many-requests'],
  },
  listVersions: {
    method: 'get',
    path: '/layouts/:id/versions',
    summary: 'The versions of a layout, newest first',
    access: SEE,
    answer: { status: 200, schema: versionListSchema },
    refusals: [],
  },
  keepVersion: {
    method: 'post',
    path: '/layouts/:id/versions',
    summary: 'Keep the draft as the next version',
    access: { anyOf: ['keep-versions'] },
    body: keepVersionSchema,
    answer: { status: 201, schema: versionKeptSchema },
    refusals: ['conflict'],
  },
  readVersion: {
    method: 'get',
    path: '/layouts/:id/versions/:number',
    summary: 'One version with its layout',
    access: SEE,
    answer: { status: 200, schema: versionDetailSchema },
    refusals: [],
  },
  downloadVersion: {
    method: 'get',
    path: '/layouts/:id/versions/:number/file',
    summary: 'A version as a layout file',
    access: SEE,
    answer: LAYOUT_FILE,
    refusals: [],
  },
  restoreVersion: {
    method: 'post',
    path: '/layouts/:id/versions/:number/restore',
    summary: 'Set the draft to a version and keep that as a new version',
    access: { anyOf: ['keep-versions'] },
    body: restoreVersionSchema,
    answer: { status: 201, schema: versionKeptSchema },
    refusals: [],
  },
  exportBundle: {
    method: 'post',
    path: '/layouts/:id/versions/:number/bundle',
    summary: 'The bundle of a version; a stop refuses it unless it is overridden in writing',
    access: { anyOf: ['export-bundle'] },
    body: bundleRequestSchema,
    answer: { status: 200, file: 'application/zip' },
    refusals: ['stopped'],
  },
} as const satisfies Record<string, RouteDeclaration>;
