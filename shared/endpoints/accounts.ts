import { z } from 'zod'
import { companyChangesSchema, companyNameSchema, companySchema } from '../schemas/company'
import { keySchema } from '../schemas/id'
import {
  emailSchema,
  invitationSchema,
  newPasswordSchema,
  personNameSchema,
  personSchema,
  rolesSchema,
} from '../schemas/person'
import { unitsSchema } from '../schemas/quantities'
import { sessionSchema } from '../schemas/session'
import { endpoint } from './endpoint'

const token = z.object({ token: z.string().min(20).max(200) })
const person = z.object({ personId: keySchema })

export const accounts = {
  /** Anybody may ask; without a session the answer holds only a token for the sign-in form. */
  readSession: endpoint({
    id: 'session.read',
    method: 'GET',
    path: '/api/session',
    gate: 'public',
    summary: 'Who is signed in, or nobody; always with the token that changing requests must carry.',
    response: z.object({ session: sessionSchema.nullable(), csrfToken: z.string() }),
  }),
  signIn: endpoint({
    id: 'session.sign-in',
    method: 'POST',
    path: '/api/session',
    gate: 'public',
    summary: 'Sign in with e-mail address and password; begins a new session.',
    body: z.object({ email: emailSchema, password: z.string().min(1, 'Write your password.').max(200) }),
    response: sessionSchema,
  }),
  signOut: endpoint({
    id: 'session.sign-out',
    method: 'DELETE',
    path: '/api/session',
    gate: 'signed-in',
    summary: 'Sign out; ends the session on the server.',
  }),
  changePassword: endpoint({
    id: 'password.change',
    method: 'PUT',
    path: '/api/password',
    gate: 'signed-in',
    summary: 'Change the own password; ends the person’s other sessions.',
    body: z.object({
      current: z.string().min(1, 'Write your present password.').max(200),
      next: newPasswordSchema,
    }),
  }),
  registerCompany: endpoint({
    id: 'company.register',
    method: 'POST',
    path: '/api/companies',
    gate: 'public',
    summary: 'Register a company; the first person is its owner and is signed in.',
    body: z.object({
      company: companyNameSchema,
      units: unitsSchema,
      name: personNameSchema,
      email: emailSchema,
      password: newPasswordSchema,
    }),
    response: sessionSchema,
    status: 201,
  }),
  readCompany: endpoint({
    id: 'company.read',
    method: 'GET',
    path: '/api/company',
    gate: 'company:read',
    summary: 'The company of the person signed in.',
    response: companySchema,
  }),
  changeCompany: endpoint({
    id: 'company.change',
    method: 'PATCH',
    path: '/api/company',
    gate: 'company:edit',
    summary: 'Change the company’s name, units and photo settings.',
    body: companyChangesSchema,
    response: companySchema,
  }),
  listPeople: endpoint({
    id: 'people.list',
    method: 'GET',
    path: '/api/people',
    gate: 'people:read',
    summary: 'The people of the company.',
    response: z.object({ people: z.array(personSchema) }),
  }),
  invitePerson: endpoint({
    id: 'people.invite',
    method: 'POST',
    path: '/api/people',
    gate: 'people:manage',
    summary: 'Add a person; answers with the one-time link to hand to them.',
    body: z.object({ name: personNameSchema, email: emailSchema, roles: rolesSchema }),
    response: invitationSchema,
    status: 201,
  }),
  changePerson: endpoint({
    id: 'people.change',
    method: 'PATCH',
    path: '/api/people/:personId',
    gate: 'people:manage',
    summary: 'Change a person’s name or roles, disable or enable them; disabling ends their sessions.',
    params: person,
    body: z.object({ name: personNameSchema, roles: rolesSchema, disabled: z.boolean() }).partial(),
    response: personSchema,
  }),
  renewInvitation: endpoint({
    id: 'people.renew-invitation',
    method: 'POST',
    path: '/api/people/:personId/invitation',
    gate: 'people:manage',
    summary: 'Make a new one-time link for a person; the older one stops working.',
    params: person,
    response: invitationSchema,
    status: 201,
  }),
  readInvitation: endpoint({
    id: 'invitation.read',
    method: 'GET',
    path: '/api/invitations/:token',
    gate: 'public',
    summary: 'Whom a one-time link is for.',
    params: token,
    response: z.object({ company: z.string(), name: z.string(), email: z.string() }),
  }),
  acceptInvitation: endpoint({
    id: 'invitation.accept',
    method: 'POST',
    path: '/api/invitations/:token',
    gate: 'public',
    summary: 'Use a one-time link: set the password and sign in.',
    params: token,
    body: z.object({ password: newPasswordSchema }),
    response: sessionSchema,
  }),
}
