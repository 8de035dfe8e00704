/** One sentence that the Bench has to tell, until it is put away or replaced. */
export class Notice {
	text = $state('');
	tone = $state<'plain' | 'bad'>('plain');

	tell(text: string, tone: 'plain' | 'bad' = 'plain'): void {
		this.text = text;
		this.tone = tone;
	}

	clear(): void {
		this.text = '';
	}
}
