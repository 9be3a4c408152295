import { ApiProperty } from '@nestjs/swagger';

export const DESK_SECTIONS = [
  'drafts',
  'to-review',
  'open-comments',
  'to-take',
  'to-approve',
  'reports',
  'due',
  'appointments',
  'notices',
] as const;
export type DeskSectionKey = (typeof DESK_SECTIONS)[number];

export class DeskItem {
  @ApiProperty({ type: String })
  readonly title!: string;

  @ApiProperty({ type: String, description: 'What waits, in a line' })
  readonly line!: string;

  @ApiProperty({ type: String, description: 'A path of the screens' })
  readonly href!: string;

  @ApiProperty({ type: String, format: 'date-time', description: 'Since when; of what is due, when' })
  readonly at!: string;
}

export class DeskSection {
  @ApiProperty({ enum: DESK_SECTIONS })
  readonly key!: DeskSectionKey;

  @ApiProperty({ type: String })
  readonly title!: string;

  @ApiProperty({ type: String, description: 'What to say when nothing waits' })
  readonly empty!: string;

  @ApiProperty({ type: [DeskItem] })
  readonly items!: DeskItem[];
}

/** What waits for the caller. Only the sections that belong to their roles. */
export class Desk {
  @ApiProperty({ type: [DeskSection] })
  readonly sections!: DeskSection[];
}
