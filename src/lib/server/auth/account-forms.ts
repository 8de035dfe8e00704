import { z } from '../../api/zod';
import { passwordFault } from './password';

const email = z
	.string({ error: 'Give your e-mail address.' })
	.trim()
	.toLowerCase()
	.max(254, 'This is too long for an e-mail address.')
	.pipe(z.email('This is not an e-mail address, such as name@firm.example.'));

const newPassword = z.string({ error: 'Choose a password.' }).superRefine((password, context) => {
	const fault = passwordFault(password);
	if (fault) context.addIssue({ code: 'custom', message: fault });
});

const words = (ask: string) =>
	z.string({ error: ask }).trim().min(1, ask).max(120, 'Keep this under 120 characters.');

export const signInForm = z.object({
	email,
	password: z.string({ error: 'Give your password.' }).min(1, 'Give your password.').max(1000),
	next: z.string().optional()
});

export const signUpForm = z.object({
	name: words('Give your name.'),
	firm: words('Name the firm that the Rack is for.'),
	email,
	password: newPassword,
	next: z.string().optional()
});

export const forgotForm = z.object({ email });

export const resetForm = z
	.object({ token: z.string().max(200), password: newPassword, again: z.string() })
	.refine(({ password, again }) => password === again, {
		path: ['again'],
		error: 'The two passwords differ.'
	});

export const switchFirmForm = z.object({ firm: z.string().max(64), next: z.string().optional() });
