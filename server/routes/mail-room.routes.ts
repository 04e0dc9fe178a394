import { openRoute } from './route';
import { ReceivedMail } from '../entities/correspondence.entities';
import { notFound } from '../errors/problem';
import { presentMail } from '../presenters/mail.presenter';

const NEWEST = 200;

/** The demo's Mail room: invented mail to invented people, so everybody may look. Without the demo it does not exist. */
export const mailRoomRoutes = [
  openRoute('getMailRoom', {
    summary: 'Mail that the demo’s own server took in',
    access: 'anyone',
    answers: { 200: 'mail-room' },
    handler: async ({ tx, context }) => {
      if (!context.config.demo) throw notFound();
      const mails = await tx.manager.find(ReceivedMail, {
        order: { receivedAt: 'DESC', id: 'ASC' },
        take: NEWEST,
      });
      return { items: mails.map(presentMail) };
    },
  }),
];
