using System.Collections.Immutable;
using JointPlanner.Engine;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.Plans;

/// <summary>
/// Every field of a plan file, said once: reader, JSON schema and screen read it here. It is a table and longer than other files for that
/// reason.
/// </summary>
public static class PlanFields
{
    private const int Name = DocumentLimits.NameLength, Note = DocumentLimits.NoteLength;

    /// <summary>Words of the columns of the counting table.</summary>
    public static readonly ImmutableArray<string> Columns = [.. Enum.GetValues<Column>().Select(Keys.Word)];
    /// <summary>Words of the causes of movement.</summary>
    public static readonly ImmutableArray<string> Causes = [.. Enum.GetValues<Cause>().Select(Keys.Word)];

    private static readonly QuantityEntry Station = new(Quantity.Length, new("-100 km", "100 km"));
    private static readonly QuantityEntry Shade = new(Quantity.Temperature, new("-90 °C", "70 °C")) { Usual = new("-60 °C", "52 °C") };
    private static readonly QuantityEntry Effective = new(Quantity.Temperature, new("-90 °C", "90 °C")) { Usual = new("-60 °C", "70 °C") };
    private static readonly QuantityEntry Reading = new(Quantity.Temperature, new("-60 °C", "100 °C")) { Usual = new("-30 °C", "45 °C") };
    private static readonly QuantityEntry Age = new(Quantity.Age, new("0 d", "200 a"));
    private static readonly QuantityEntry Height = new(Quantity.Length, new("0.2 m", "400 m")) { Usual = new("0.5 m", "200 m") };
    private static readonly QuantityEntry Strain = new(Quantity.Strain, new("0 µε", "5000 µε")) { Usual = new("0 µε", "1500 µε") };
    private static readonly QuantityEntry GivenMovement = new(Quantity.Movement, new("0 mm", "5 m")) { Usual = new("0 mm", "1 m") };
    private static readonly RatioEntry Factor = new(0, 10);
    private static readonly QuantityEntry Level = new(Quantity.Size, new("0 mm", "30 m")) { Usual = new("0 mm", "12 m") };
    private static readonly QuantityEntry GroundMovement = new(Quantity.Movement, new("-5 m", "5 m")) { Usual = new("-200 mm", "200 mm") };
    private static readonly QuantityEntry LineLoad = new(Quantity.LineLoad, new("-1000 kN/m", "1000 kN/m")) { Usual = new("0 kN/m", "300 kN/m") };
    private static readonly QuantityEntry Difference = new(Quantity.TemperatureDifference, new("-60 K", "60 K")) { Usual = new("-30 K", "40 K") };
    private static readonly QuantityEntry OwnForce = new(Quantity.Force, new("0 kN", "100 MN")) { Usual = new("0 kN", "5 MN") };

    private static Field Group(string pattern, string name, string meaning, bool isRequired = false, bool isAlwaysThere = false) =>
        new(pattern, name, new GroupEntry { IsAlwaysThere = isAlwaysThere }, meaning) { IsRequired = isRequired };

    private static Field Needed(string pattern, string name, Entry entry, string meaning, string hint = "") =>
        new(pattern, name, entry, meaning) { IsRequired = true, Hint = hint };

    private static Field Maybe(string pattern, string name, Entry entry, string meaning, string hint = "") => new(pattern, name, entry, meaning) { Hint = hint };

    private static Field Default(string pattern, string name, Entry entry, string meaning, string text, string reason, string hint = "") =>
        new(pattern, name, entry, meaning) { Default = text, DefaultReason = reason, Hint = hint };

    private static IEnumerable<Field> Shortening(string word, string name) =>
    [
        Group($"segments/*/{word}", name, $"{name} of the whole deck, given by the designer; leave out where the deck has none or all of it is over."),
        Needed($"segments/*/{word}/strain", $"{name} strain", Strain, "Strain at the end of life, shortening positive.", "300 µε"),
        Needed($"segments/*/{word}/source", $"source of the {word} strain", new TextEntry(Note), "Where the strain comes from.", "designer's calculation, sheet 21"),
        Maybe($"segments/*/{word}/development", $"development of {word}", new ListEntry(0, 200, "point of the curve"),
            "How much of it is over at which deck age; between points linear in the age; without points all of it is still to come."),
        Needed($"segments/*/{word}/development/*/age", "deck age", Age, "Deck age of this point.", "28 d"),
        Needed($"segments/*/{word}/development/*/share", "share over", new RatioEntry(0, 1), "Share of the strain that is over by then, 0 to 1.", "0.4"),
    ];

    /// <summary>Methods of measuring, in a plan or an owner's rule set.</summary>
    internal static IEnumerable<Field> Measuring(string pattern) =>
    [
        Maybe(pattern, "methods of measuring", new ListEntry(0, 8, "method of measuring"),
            "Ways in which the temperature of the structure may be measured on the day, each with its uncertainty; each gets a table of its own."),
        Needed($"{pattern}/*/id", "id", new IdEntry(), "Short name in this file, fixed once issued."),
        Needed($"{pattern}/*/name", "name of the method", new TextEntry(Name), "What people call it.", "contact thermometer on shaded surfaces"),
        Needed($"{pattern}/*/temperature-uncertainty", "uncertainty of the temperature",
            new QuantityEntry(Quantity.TemperatureDifference, new("0 K", "20 K")) { Usual = new("0.2 K", "8 K") },
            "One standard deviation of the mean temperature so measured.", "2 K"),
        Needed($"{pattern}/*/source", "source of the uncertainty", new TextEntry(Note), "Where the uncertainty comes from."),
    ];

    private static IEnumerable<Field> Profile(string word, string name) =>
    [
        Maybe($"segments/*/gradient/{word}", $"profile, {name}", new ListEntry(0, 20, "point of the profile"), $"Temperature difference over the depth while the deck is {name}, from the top down."),
        Needed($"segments/*/gradient/{word}/*/depth", "depth", Level, "Below the top of the section.", "100 mm"),
        Needed($"segments/*/gradient/{word}/*/difference", "difference", Difference, "Above the uniform part of the temperature.", "10 K"),
    ];

    /// <summary>The table.</summary>
    public static readonly FieldTable Table = new("joint-plan", 1,
    [
        Needed("schema", "schema", new WordEntry(["joint-plan/1"]), "What this file is.", "joint-plan/1"),

        Group("structure", "structure", "What the structure is called and where it stands.", isRequired: true),
        Needed("structure/number", "structure number", new TextEntry(Name), "The owner's number of the structure.", "B-1042"),
        Needed("structure/name", "structure name", new TextEntry(Name), "What the structure is called."),
        Needed("structure/place", "place", new TextEntry(Name), "Where it stands, in words."),
        Default("structure/time-zone", "time zone", new OutsideWordEntry("time-zone"), "IANA time zone of the site, for instance Europe/Paris.",
            "Etc/UTC", "no time zone of the site is given: times are shown in UTC"),
        Maybe("structure/altitude", "altitude", new QuantityEntry(Quantity.Length, new("-500 m", "6000 m")), "Height of the site above sea level.", "310 m"),

        Default("display", "units shown", new WordEntry(["metric", "us"]), "Units in which screen and sheet show the plan; what was typed stays as typed.",
            "metric", "no choice of units is given"),

        Group("basis", "basis", "The code edition and owner's rules, and how the doubts they leave are treated.", isRequired: true),
        Needed("basis/code", "code edition", new OutsideWordEntry("code"), "Id of the code edition; own basis where every number is the designer's."),
        Maybe("basis/profile", "profile of the code", new OutsideWordEntry("profile"), "Named set of national or regional parameters; the code's first where none is given."),
        Maybe("basis/owner-rules", "owner's rules", new OutsideWordEntry("owner-rules"), "Id of the owner's rule set laid over the code."),
        Maybe("basis/setting-doubt", "doubt about the setting temperature", new WordEntry(["none", "specified", "unspecified"]),
            "How the doubt about the temperature on the day of setting is treated when sizing; the code's own way where nothing is given."),
        Maybe("basis/safety", "safety format", new WordEntry(["none", "degrees", "factor"]), "How safety is put on thermal movement; the code's own way where nothing is given."),
        Maybe("basis/answers", "answers to silent entries", new ListEntry(0, 200, "answer"), "The designer's answers where code and owner say nothing about a cause of movement."),
        Needed("basis/answers/*/cause", "cause", new WordEntry(Causes), "The cause of movement."),
        Needed("basis/answers/*/column", "judgement", new WordEntry(Columns), "By what the movement is judged."),
        Maybe("basis/answers/*/factor", "factor", Factor, "Factor on the movement from setting.", "1.0"),
        Maybe("basis/answers/*/counted", "counted", new FalseEntry(), "false where the movement is not counted."),
        Needed("basis/answers/*/source", "source of the answer", new TextEntry(Note), "Why it counts so."),

        Group("climate", "climate", "Temperatures of the site; which of them are needed depends on the basis.", isRequired: true),
        Maybe("climate/source", "source of the temperatures", new TextEntry(Note), "Where the temperatures come from."),
        Maybe("climate/zone", "climate zone", new OutsideWordEntry("zone"), "Climate zone in the basis's word."),
        Maybe("climate/shade-max", "highest shade air temperature", Shade, "Highest shade air temperature of the basis's return period.", "38 °C"),
        Maybe("climate/shade-min", "lowest shade air temperature", Shade, "Lowest shade air temperature of the basis's return period.", "-16 °C"),
        Maybe("climate/effective-max", "highest effective temperature", Effective, "Highest effective temperature of the deck, given directly.", "40 °C"),
        Maybe("climate/effective-min", "lowest effective temperature", Effective, "Lowest effective temperature of the deck, given directly.", "-10 °C"),
        Default("climate/warming", "warming allowance", new QuantityEntry(Quantity.TemperatureDifference, new("0 K", "10 K")),
            "Added to the highest temperature only; never raises the lowest.", "0 K", "no warming allowance is given", "2 K"),

        new("supports", "supports", new ListEntry(1, 2000, "support") { WhyFewest = "There are no supports for the deck to stand on." },
            "Abutments, piers and towers in station order.") { IsRequired = true },
        Needed("supports/*/id", "id", new IdEntry(), "Short name in this file, fixed once issued."),
        Maybe("supports/*/mark", "mark", new TextEntry(Name), "What the drawing calls it.", "Pier 2"),
        Needed("supports/*/station", "station of the support", Station, "Station of the support line.", "42 m"),
        Needed("supports/*/kind", "kind of support", new WordEntry(["abutment", "pier", "tower"]), "Kind of support."),
        Default("supports/*/stiffness", "stiffness along the deck", new QuantityEntry(Quantity.Stiffness, new("1 N/m", "1e9 MN/m")) { OrWord = "rigid" },
            "Force at bearing level for a unit of movement along the deck, or rigid.", "rigid", "no stiffness is given: taken as unyielding", "40 MN/m"),
        Group("supports/*/column", "column", "Column from which the stiffness follows, instead of giving it."),
        Needed("supports/*/column/height", "height of the column", Height, "From foundation to bearing level.", "9 m"),
        Needed("supports/*/column/modulus", "modulus of the column", new QuantityEntry(Quantity.Stress, new("100 MPa", "1000 GPa")) { Usual = new("5 GPa", "250 GPa") },
            "Modulus of elasticity, all columns of the support together with the second moment of area.", "31 GPa"),
        Needed("supports/*/column/inertia", "second moment of area of the column", new QuantityEntry(Quantity.Inertia, new("1e-8 m⁴", "1e6 m⁴")),
            "About the axis across the deck, all columns of the support together.", "0.55 m4"),
        Maybe("supports/*/column/foundation-along", "foundation stiffness along the deck", new QuantityEntry(Quantity.Stiffness, new("1 N/m", "1e9 MN/m")),
            "Unyielding where nothing is given.", "900 MN/m"),
        Maybe("supports/*/column/foundation-turning", "foundation stiffness against turning",
            new QuantityEntry(Quantity.RotationalStiffness, new("1e-3 MN·m/rad", "1e9 MN·m/rad")), "Unyielding where nothing is given.", "9000 MN·m/rad"),
        Group("supports/*/movement", "movement of the support", "What of its movement is still to come after joints and bearings are set; leave out where nothing is known of it."),
        Default("supports/*/movement/settlement", "settlement", GroundMovement, "Downward positive.", "0 mm", "no settlement is given", "10 mm"),
        Default("supports/*/movement/along", "movement along the deck", GroundMovement,
            "Of bearing level, positive up-station: translation, pavement and embankment push.", "0 mm", "no movement along is given", "-8 mm"),
        Default("supports/*/movement/tilt", "tilt", new QuantityEntry(Quantity.Rotation, new("-0.1 rad", "0.1 rad")) { Usual = new("-0.01 rad", "0.01 rad") },
            "About bearing level, positive when the support leans up-station.", "0 rad", "no tilt is given", "0.001 rad"),
        Needed("supports/*/movement/source", "source of the support's movement", new TextEntry(Note), "Where it comes from."),
        Maybe("supports/*/height", "height for the drawing", Height, "Height of the support on the drawing.", "9 m"),

        new("segments", "deck segments", new ListEntry(1, 2000, "deck segment") { WhyFewest = "The deck is empty: there is no segment." },
            "Deck segments in station order, each continuous from one joint to the next.") { IsRequired = true },
        Needed("segments/*/id", "id", new IdEntry(), "Short name in this file, fixed once issued."),
        Maybe("segments/*/mark", "mark", new TextEntry(Name), "What the drawing calls it.", "West deck"),
        Needed("segments/*/start", "start of the segment", Station, "Station of its lower end, at road level.", "0 m"),
        Needed("segments/*/end", "end of the segment", Station, "Station of its upper end, at road level.", "128 m"),
        Needed("segments/*/kind", "kind of deck", new WordEntry(["concrete", "composite", "steel"]), "What the deck is made of, as codes group decks for temperature."),
        Maybe("segments/*/depth", "depth of the deck", new QuantityEntry(Quantity.Length, new("0.1 m", "30 m")) { Usual = new("0.2 m", "12 m") },
            "Depth of the deck on the drawing.", "2.4 m"),
        Default("segments/*/axial-stiffness", "axial stiffness EA", new QuantityEntry(Quantity.AxialStiffness, new("1 MN", "1e6 GN")) { Usual = new("1 GN", "2000 GN") },
            "Modulus times area of the whole section.", "100 GN",
            "from memory, typical two-lane deck; matters only where supports share restraint", "210 GN"),
        Maybe("segments/*/expansion", "coefficient of expansion",
            new QuantityEntry(Quantity.Expansion, new("1e-6 /K", "40e-6 /K")) { Usual = new("6e-6 /K", "14e-6 /K") },
            "For length; the basis's value where nothing is given.", "10e-6 /K"),
        Group("segments/*/section", "cross-section", "Layers of the section, instead of giving EA; the deck then bends in the model and its levels count."),
        Needed("segments/*/section/depth", "depth of the section", new QuantityEntry(Quantity.Size, new("50 mm", "30 m")) { Usual = new("200 mm", "12 m") },
            "From the top of the uppermost layer, without surfacing, to the soffit.", "1750 mm"),
        Maybe("segments/*/section/bearing-depth", "depth of bearing level", new QuantityEntry(Quantity.Size, new("0 mm", "35 m")),
            "Where bearings turn and slide, below the top of the section; the soffit where nothing is given.", "1800 mm"),
        Default("segments/*/section/surfacing", "surfacing", new QuantityEntry(Quantity.Size, new("0 mm", "2 m")) { Usual = new("0 mm", "300 mm") },
            "Height of the road surface above the top of the section.", "0 mm", "no surfacing is given", "90 mm"),
        Maybe("segments/*/section/connection", "stiffness of the connection", new QuantityEntry(Quantity.ConnectionStiffness, new("1e-3 MN/m²", "1e6 MN/m²")),
            "Between slab and steel: force per length of deck for a unit of slip.", "1000 MN/m2"),
        Default("segments/*/section/relief-spacing", "spacing of relief joints", new QuantityEntry(Quantity.Length, new("0.5 m", "500 m")) { Usual = new("2 m", "100 m") },
            "Of a slab that is carried by its steel without acting with it.", "50 ft", "common practice, no source: small relief joints about every 50 ft", "50 ft"),
        new("segments/*/section/layers", "layers", new ListEntry(1, 60, "layer") { WhyFewest = "The section is empty: there is no layer." }, "Layers that act together.") { IsRequired = true },
        Needed("segments/*/section/layers/*/id", "id", new IdEntry(), "Short name within the section, for instance slab."),
        Needed("segments/*/section/layers/*/material", "material of the layer", new WordEntry(["concrete", "steel"]), "What it is made of."),
        Needed("segments/*/section/layers/*/modulus", "modulus of the layer", new QuantityEntry(Quantity.Stress, new("100 MPa", "1000 GPa")) { Usual = new("5 GPa", "250 GPa") },
            "Modulus of elasticity, short-term.", "34 GPa"),
        Needed("segments/*/section/layers/*/area", "area of the layer", new QuantityEntry(Quantity.Area, new("1e-6 m²", "1000 m²")), "Area of the layer, of all girders that the frame stands for.", "0.625 m2"),
        Needed("segments/*/section/layers/*/depth", "depth of the layer", Level, "Of its centroid below the top of the section.", "125 mm"),
        Maybe("segments/*/section/layers/*/height", "height of the layer", new QuantityEntry(Quantity.Size, new("0.1 mm", "30 m")), "Of a layer of uniform width.", "250 mm"),
        Maybe("segments/*/section/layers/*/inertia", "second moment of area of the layer", new QuantityEntry(Quantity.Inertia, new("1e-12 m⁴", "1e6 m⁴")),
            "About its own centroid, instead of a height.", "0.0126 m4"),
        Maybe("segments/*/section/layers/*/expansion", "coefficient of expansion of the layer",
            new QuantityEntry(Quantity.Expansion, new("1e-6 /K", "40e-6 /K")) { Usual = new("6e-6 /K", "14e-6 /K") },
            "Best estimate for this layer; that of the segment where nothing is given.", "10e-6 /K"),
        Group("segments/*/gradient", "temperature difference", "Vertical temperature difference, where it is computed; profiles given here, or else those of the basis."),
        Maybe("segments/*/gradient/zone", "zone of solar warming", new WordEntry(["1", "2", "3", "4"]), "Where the basis asks for one."),
        Default("segments/*/gradient/surface", "surface of the deck", new WordEntry(["bare", "waterproofed", "surfaced"]), "As the basis asks for it.", "surfaced", "nothing is said of the surface"),
        Default("segments/*/gradient/shape", "shape of a concrete deck", new WordEntry(["box", "beams-or-slab"]), "As the basis asks for it.", "beams-or-slab", "nothing is said of the shape"),
        .. Profile("warm", "warmer above"),
        .. Profile("cool", "cooler above"),
        Maybe("segments/*/gradient/source", "source of the profiles", new TextEntry(Note), "Where given profiles come from."),
        Group("segments/*/dead-load", "dead load still to come", "What is placed after the joint is set: surfacing, barriers."),
        Needed("segments/*/dead-load/load", "dead load", LineLoad, "Per length of deck, downward positive; zero where none is to come.", "18 kN/m"),
        Needed("segments/*/dead-load/source", "source of the dead load", new TextEntry(Note), "Where it comes from."),
        Group("segments/*/braking", "braking", "Braking force on the segment, where its movement is computed."),
        Needed("segments/*/braking/force", "braking force", OwnForce, "At road-surface level, on the whole segment; it acts either way.", "450 kN"),
        Needed("segments/*/braking/source", "source of the braking force", new TextEntry(Note), "Where it comes from."),
        .. Shortening("creep", "creep"),
        .. Shortening("shrinkage", "shrinkage"),
        .. ConcreteFields.Of("segments/*/concrete"),

        new("bearings", "bearings", new ListEntry(1, 8000, "bearing line") { WhyFewest = "There are no bearings: nothing carries the deck." },
            "Bearing lines: one for each segment and support, or segment that carries it.") { IsRequired = true },
        Needed("bearings/*/id", "id", new IdEntry(), "Short name in this file, fixed once issued."),
        Maybe("bearings/*/mark", "mark", new TextEntry(Name), "What the drawing calls it.", "B2"),
        Needed("bearings/*/segment", "segment carried", new ReferenceEntry(["segments"]), "The segment that the line carries."),
        Needed("bearings/*/on", "what it stands on", new ReferenceEntry(["supports", "segments"]), "The support, or the segment that carries this one."),
        Maybe("bearings/*/station", "station of the bearing line", Station, "The support's station where nothing is given; needed on a carrying segment.", "128 m"),
        Needed("bearings/*/kind", "kind of bearing", new WordEntry(["fixed", "free", "elastomeric", "monolithic"]), "What the line does along the deck."),
        Maybe("bearings/*/depth", "depth of the bearing line", new QuantityEntry(Quantity.Size, new("0 mm", "35 m")),
            "Its own level below the top of the section, for instance of a half joint; that of the section where nothing is given.", "900 mm"),
        Group("bearings/*/pads", "pads", "The pads of an elastomeric line."),
        Needed("bearings/*/pads/count", "number of pads", new CountEntry(1, 500), "Pads in the line."),
        Needed("bearings/*/pads/shear-modulus", "shear modulus", new QuantityEntry(Quantity.Stress, new("0.05 MPa", "20 MPa")) { Usual = new("0.4 MPa", "2 MPa") },
            "Shear modulus of the elastomer.", "0.9 MPa"),
        Needed("bearings/*/pads/plan-area", "plan area of one pad", new QuantityEntry(Quantity.PlanArea, new("1000 mm²", "20 m²")), "Plan area of one pad.", "0.16 m2"),
        Needed("bearings/*/pads/elastomer-thickness", "elastomer thickness", new QuantityEntry(Quantity.Size, new("1 mm", "2 m")) { Usual = new("5 mm", "0.6 m") },
            "All elastomer in shear, without steel plates.", "60 mm"),
        Group("bearings/*/setting", "setting state of the bearing", "When upper and lower parts were tied at zero shear."),
        Maybe("bearings/*/setting/temperature", "temperature at setting of the bearing", Reading, "Structure temperature then.", "12 °C"),
        Maybe("bearings/*/setting/deck-age", "deck age at setting of the bearing", Age, "Age of the deck then; needed where it shortens.", "60 d"),

        Maybe("joints", "joints", new ListEntry(0, 200, "joint"), "Expansion joints in station order."),
        Needed("joints/*/id", "id", new IdEntry(), "Short name in this file, fixed once issued."),
        Maybe("joints/*/mark", "mark", new TextEntry(Name), "What the drawing calls it.", "J1"),
        Needed("joints/*/near", "near body", new ReferenceEntry(["supports", "segments"]), "The body whose face is at the smaller station: a segment, an abutment or a tower."),
        Needed("joints/*/far", "far body", new ReferenceEntry(["supports", "segments"]), "The body ahead: a segment, an abutment or a tower."),
        Default("joints/*/skew", "skew", new QuantityEntry(Quantity.Angle, new("-80°", "80°")) { Usual = new("-45°", "45°") },
            "Angle between the joint line and the line square to the deck axis, signed.", "0°", "no skew is given: taken as square", "15°"),
        Group("joints/*/setting", "setting state of the joint", "When the joint is expected to be set.", isRequired: true),
        Needed("joints/*/setting/temperature", "temperature at setting of the joint", Reading, "Structure temperature at which the joint is expected to be set.", "12 °C"),
        Default("joints/*/setting/temperature-uncertainty", "uncertainty of the temperature",
            new QuantityEntry(Quantity.TemperatureDifference, new("0 K", "20 K")) { Usual = new("0 K", "8 K") },
            "One standard deviation of the structure temperature as it will be measured.", "2 K", "our proposal, not published", "2 K"),
        Default("joints/*/setting/measure-uncertainty", "uncertainty of the opening", new QuantityEntry(Quantity.Movement, new("0 mm", "50 mm")) { Usual = new("0 mm", "10 mm") },
            "One standard deviation of the measured opening.", "1 mm", "our proposal, not published", "1 mm"),
        Default("joints/*/setting/remaining-uncertainty", "uncertainty of the movement to come",
            new QuantityEntry(Quantity.Movement, new("0 mm", "1 m")) { Usual = new("0 mm", "100 mm") },
            "One standard deviation of the movement still to come.", "0 mm", "no uncertainty of the movement to come is given: taken as none", "0 mm"),
        Maybe("joints/*/setting/near-deck-age", "age of the near deck", Age, "Age of the near deck at setting; needed where it shortens.", "90 d"),
        Maybe("joints/*/setting/far-deck-age", "age of the far deck", Age, "Age of the far deck at setting; needed where it shortens.", "90 d"),
        Maybe("joints/*/setting/least-deck-age", "least deck age", Age, "Least deck age at which the joint may be set.", "28 d"),
        Group("joints/*/choice", "choice", "The designer's choice of joint, where it is not left to the program."),
        Needed("joints/*/choice/family", "family chosen", new OutsideWordEntry("family"), "Family of joint."),
        Maybe("joints/*/choice/size", "size chosen", new TextEntry(Name), "Name of the size; the smallest that fits where nothing is given."),
        Needed("joints/*/choice/reason", "reason of the choice", new TextEntry(Note), "Why the designer chose so."),

        Maybe("movements", "given movements", new ListEntry(0, 2600, "given movement"), "Movements by causes that are not computed."),
        Needed("movements/*/id", "id", new IdEntry(), "Short name in this file, fixed once issued."),
        Needed("movements/*/joint", "joint", new ReferenceEntry(["joints"]), "The joint that moves."),
        Needed("movements/*/cause", "cause", new WordEntry(Causes), "The cause of movement."),
        Needed("movements/*/opens-by", "opens by", GivenMovement, "How far it opens the joint along the deck.", "1.5 mm"),
        Needed("movements/*/closes-by", "closes by", GivenMovement, "How far it closes the joint along the deck.", "2.5 mm"),
        Needed("movements/*/source", "source of the movement", new TextEntry(Note), "Where it comes from, or why none acts."),

        Group("live-load", "live load", "Traffic, where its movements are computed."),
        Needed("live-load/stands-for", "what the frame stands for", new WordEntry(["whole-width", "girder-line"]), "The whole width with all its lanes, or one girder line with its share of them."),
        Maybe("live-load/lanes", "number of lanes", new CountEntry(1, 20), "Traffic lanes that the deck can hold.", "2"),
        Maybe("live-load/carriageway", "width of the carriageway", new QuantityEntry(Quantity.Length, new("2 m", "60 m")), "Between kerbs, where the basis makes lanes of it.", "8 m"),
        Maybe("live-load/distribution", "distribution factor", new RatioEntry(0.01, 10), "Lanes that one girder line takes; no default.", "0.7"),
        Maybe("live-load/distribution-source", "source of the distribution factor", new TextEntry(Note), "Where it comes from."),
        Group("live-load/own", "own loads", "Loads of one lane, instead of those of the basis."),
        Maybe("live-load/own/trains", "trains of axles", new ListEntry(0, 40, "train"), "The worst of them counts."),
        Needed("live-load/own/trains/*/id", "id", new IdEntry(), "Short name in this file."),
        new("live-load/own/trains/*/axles", "axles", new ListEntry(1, 40, "axle") { WhyFewest = "The train has no axle." }, "From the first axle on.") { IsRequired = true },
        Needed("live-load/own/trains/*/axles/*/force", "axle load", OwnForce, "Force of the axle.", "145 kN"),
        Maybe("live-load/own/trains/*/axles/*/spacing", "axle spacing", new QuantityEntry(Quantity.Length, new("0.1 m", "200 m")), "Behind the axle before it; none for the first.", "4.3 m"),
        Maybe("live-load/own/trains/*/axles/*/spacing-most", "largest axle spacing", new QuantityEntry(Quantity.Length, new("0.1 m", "200 m")), "Where the spacing varies.", "9 m"),
        Default("live-load/own/uniform", "uniform load", LineLoad, "Per length, on adverse lengths.", "0 kN/m", "no uniform load is given", "9.3 kN/m"),
        Maybe("live-load/own/dynamic", "dynamic factor", new RatioEntry(1, 3), "On the trains alone; 1 where nothing is given.", "1.33"),
        Needed("live-load/own/source", "source of the loads", new TextEntry(Note), "Where they come from."),

        Group("setting-table", "setting table", "Rows of the setting table.", isAlwaysThere: true),
        Maybe("setting-table/from", "lowest temperature of the table", Effective, "The lowest effective temperature where nothing is given.", "-10 °C"),
        Maybe("setting-table/to", "highest temperature of the table", Effective, "The highest effective temperature where nothing is given.", "40 °C"),
        Default("setting-table/step", "step of the table", new QuantityEntry(Quantity.TemperatureDifference, new("0.1 K", "50 K")), "Step between rows.",
            "5 K", "our proposal", "5 K"),
        Maybe("setting-table/ages", "deck ages of the table", new ListEntry(0, 20, "deck age"), "Further deck ages to tabulate."),
        new("setting-table/ages/*", "deck age of the table", Age, "A deck age to tabulate.") { Hint = "180 d" },

        Group("setting-day", "day of setting", "How the temperature of the structure is found on the day of setting."),
        .. Measuring("setting-day/methods"),
        Maybe("setting-day/points", "points measured", new ListEntry(0, 8, "measuring point"),
            "Points whose temperatures make the mean temperature; one mean temperature, found by the person, where nothing is given."),
        Needed("setting-day/points/*/id", "id", new IdEntry(), "Short name in this file, fixed once issued."),
        Needed("setting-day/points/*/name", "name of the point", new TextEntry(Name), "Where it lies.", "deck slab"),
        Needed("setting-day/points/*/weight", "weight of the point", new RatioEntry(0.001, 1_000_000),
            "Its weight in the mean: expansion × stiffness × area of the part that it stands for, on any scale.", "0.55"),
    ]);
}
