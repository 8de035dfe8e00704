/** Processor time of this process so far, ms: unlike the clock, it stands while others have the processor. */
export const processorTime = (): number => {
	const { user, system } = process.cpuUsage();
	return (user + system) / 1000;
};
