import type { Metadata } from 'next'
import { AccountKept } from '@/components/site/account-kept'
import { Part } from '@/components/site/part'
import { WriteToUs } from '@/components/site/write-to-us'
import { MAKER } from '@/lib/maker/terms'
import { GIVEN_UP_STAYS_DAYS, SENT_STAYS_DAYS } from '@/lib/mail/terms'
import { env } from '@/lib/server/env'

export const metadata: Metadata = { title: 'Privacy' }

/** True to what the code keeps. Whoever adds a table or a cookie changes this page with it. */
export default function PrivacyPage() {
  const keptHere = env().mail.smtp === null
  return (
    <main id="main" className="w pg">
      <h1>Privacy</h1>
      <p className="lead">
        We keep what you give us to keep, for you and for the people who answer you. Nobody is followed, and nothing is
        sold or passed on.
      </p>
      <Part id="checking" title="While you check">
        <p>
          A check needs no account. What you type stands in the address of the page and stays on your device, so that
          nothing is lost when the line breaks. It is sent to us to be reckoned and is not kept. When you ask for the
          sheet, we keep your answers and what came of them.
        </p>
        <p>
          A sheet belongs to whoever has its code. It has no name on it and stays until someone asks us to delete it, so
          that a printed code still opens. Make a new code on the sheet, and the old one opens nothing.
        </p>
      </Part>
      <Part id="account" title="With an account">
        <AccountKept />
      </Part>
      <Part id="mail" title="Mail">
        <p>
          We write when you ask for something that takes a mail, and when something about your account changes. There is
          no newsletter, no picture that reports back, and every mail says why you get it.
        </p>
        <p>
          We remember for {SENT_STAYS_DAYS} days that a mail went to your address, and for {GIVEN_UP_STAYS_DAYS} when it
          could not be delivered. Its words and its link are thrown out once it is sent.
          {keptHere && ' This site has no mail server, so mails do not leave it: they are kept here, and an admin can read them.'}
        </p>
      </Part>
      <Part id="cookies" title="Cookies and what is counted">
        <p>
          At most two cookies, both ours. One keeps you signed in, until you sign out or it runs out. One remembers
          whether you chose light or dark, for a year. Neither is there until you ask for what it does.
        </p>
        <p>
          So that nobody can try passwords all day, we count tries, under a short name made from your network address.
          The count is thrown out within hours. When something of ours breaks, our log notes the page and the time, not who you are.
        </p>
        <p>
          Pages, fonts and drawings all come from this site. It asks no other company for anything, and there is no
          measuring of visitors.
        </p>
      </Part>
      <Part id="who" title="Who sees it">
        <p>
          You see what is yours, and whoever has a sheet’s code sees that sheet. Admins of the workshop see who has an
          account; staff and admins see to whom mail went. Nobody else is shown anything, and a serial number is never public.
        </p>
      </Part>
      <Part id="yours" title="What you can do">
        <p>
          On your account page you can change your name and address, see where you are signed in and sign out
          everywhere, take everything with you in one file, and delete the account. It goes a week after you ask, so
          that you can change your mind. Its sheets stay under their codes, with nothing that says they were yours.
        </p>
        <p>
          Anything else, such as deleting a sheet: write to {MAKER.fullName} at <WriteToUs />.
        </p>
        <p>
          Where you live the law may give you more than this page does. Then the law goes first, and this page takes
          nothing away from it.
        </p>
      </Part>
    </main>
  )
}
