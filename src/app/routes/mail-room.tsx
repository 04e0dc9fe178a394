import type { QueryClient } from '@tanstack/react-query';
import { mailRoomQuery } from '../../features/mail-room/api/get-mail-room';
import { MailRoomPage } from '../../features/mail-room/components/mail-room-page';

export const prefetch = (client: QueryClient) => client.prefetchQuery(mailRoomQuery());

export const Component = MailRoomPage;
