/** One running clock an id; starting an id again starts its time afresh. */
export function createClocks() {
	const running = new Map<number, ReturnType<typeof setTimeout>>();
	const stop = (id: number) => {
		clearTimeout(running.get(id));
		running.delete(id);
	};
	return {
		start(id: number, time: number, end: () => void) {
			stop(id);
			running.set(id, setTimeout(end, time));
		},
		stop
	};
}
