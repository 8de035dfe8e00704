declare global {
	namespace App {
		interface Error {
			message: string;
			/** Request id: ties what a person sees to the log. */
			id?: string;
		}
		interface Locals {
			/** Id of the request, also in the `x-request-id` header and in every log line. */
			requestId: string;
		}
	}
}

export {};
