using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Sheets;

/// <summary>What a card says besides its content: whose it is, which print it is, and where its page lies.</summary>
/// <param name="ClubName">Club.</param>
/// <param name="KitName">Kit.</param>
/// <param name="BoardIssue">Issue of the kit's circuit board, as printed on it.</param>
/// <param name="FromBand">Band the kit was made for.</param>
/// <param name="ToBand">Band it goes to.</param>
/// <param name="BandColour">Colour of the band's labels as a word; empty where the club uses none.</param>
/// <param name="BoardNumber">Board; null leaves a line to write on.</param>
/// <param name="Tag">Builder's tag; null leaves a line to write on.</param>
/// <param name="CardNumber">Counts content changes of this stage's card.</param>
/// <param name="PlanNumber">Plan revision.</param>
/// <param name="Date">Date of printing.</param>
/// <param name="CardAddress">Address of the board's page, as the QR code holds it.</param>
/// <param name="Paper">Paper.</param>
/// <param name="Instruments">Name of the instrument to use, by sort; a sort without one leaves a line to write on.</param>
public sealed record CardContext(
    string ClubName,
    string KitName,
    string BoardIssue,
    string FromBand,
    string ToBand,
    string BandColour,
    string? BoardNumber,
    string? Tag,
    int CardNumber,
    int PlanNumber,
    DateOnly Date,
    string CardAddress,
    PaperSize Paper,
    IReadOnlyDictionary<InstrumentClass, string> Instruments);

/// <summary>A card to print.</summary>
/// <param name="Content">What it holds.</param>
/// <param name="Context">Whose it is.</param>
public sealed record PrintedCard(CardContent Content, CardContext Context);
