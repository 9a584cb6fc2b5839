// Texts are marked with $localize in the message catalogue, which the server shares with the screens.
import '@angular/localize/init';
