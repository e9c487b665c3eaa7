import { bothDevices, theatre } from './support/journey';
import { aPaper } from './support/papers';

const { journey } = theatre('clerk_disputes');
const tote = 'Tote 600×400×280';

for (const device of bothDevices) {
  journey(
    `a clerk at the ${device} announces fulls, disputes the plant’s count with a PDF, and both read the same thread`,
    async ({ at, scene }) => {
      const reference = `DN-${device}-1`;
      const inge = await at(device, scene.people.inge);
      await inge.open('/');
      await inge.arrives('Today');
      await inge.follow('Announce fulls');
      await inge.arrives('Announce fulls');
      await inge.pick('To', 'Fennmark Heat Pumps: Tarnby Assembly');
      await inge.pick('Container type', tote);
      await inge.write('Units', '120');
      await inge.write(/^Number of your note/, reference);
      await inge.isInOrder();
      await inge.press('Announce fulls');
      await inge.sees('Sent. Fennmark Heat Pumps sees it now.');

      const ane = await at(device === 'phone' ? 'desk' : 'phone', scene.people.ane);
      await ane.open('/');
      await ane.follow(`Count ${reference}`);
      await ane.press(`Other number, or damaged: ${tote}`);
      await ane.write(`${tote}, counted`, '112');
      await ane.press('Send count');
      await ane.sees('What differs stands in the list of differences now.');

      await inge.follow(`Open ${reference}`);
      await inge.sees('8 fewer than declared');
      await inge.follow('Dispute this count');
      await inge.arrives('Dispute a count');
      await inge.press('Send dispute');
      await inge.sees(/need(s)? another look/);
      await inge.write('How many do you say it should be?', '120');
      await inge.sees('8 more than counted.');
      await inge.pick('Why', 'It was counted wrongly');
      await inge.write('What happened', 'Your gate signed for 120.');
      await inge.field('+ paper: Paper').setInputFiles(aPaper('signed-note.pdf'));
      await inge.one('link', /signed-note\.pdf/).waitFor();
      await inge.isInOrder();
      await inge.press('Send dispute');
      await inge.one('heading', new RegExp(`Count of ${reference}`)).waitFor();
      await inge.sees('The plant has the next word, since today.');
      await inge.isInOrder();

      await ane.open('/disputes');
      await ane.arrives('Disputes');
      await ane.sees('waits for you');
      await ane.isInOrder();
      await ane.follow(new RegExp(`Count of ${reference}`));
      await ane.sees('Your gate signed for 120.');
      await ane.one('link', /signed-note\.pdf/).waitFor();
      await ane.field('Accept in part').check();
      await ane.write('How many do you accept?', '5');
      await ane.sees(/The count is put right by 5 more, to 117/);
      await ane.write('What do you tell them?', 'Five stood behind the rack. Three we do not find.');
      await ane.isInOrder();
      await ane.press('Send answer');
      await ane.sees('5 of 8 accepted. The count stands at 117.');
      await ane.isInOrder();

      await inge.page.reload();
      await inge.sees('Five stood behind the rack. Three we do not find.');
      await inge.sees('5 of 8 accepted. The count stands at 117.');
      await inge.follow(`Shipment ${reference}`);
      await inge.sees('117');
      await inge.sees('first counted 112');
      await inge.sees('3 fewer than declared');
      await inge.isInOrder();
    },
  );
}
