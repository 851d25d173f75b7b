/**
 */
package gapwright.model;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EDataType;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EPackage;
import org.eclipse.emf.ecore.EReference;

/**
 * <!-- begin-user-doc -->
 * The <b>Package</b> for the model.
 * It contains accessors for the meta objects to represent
 * <ul>
 *   <li>each class,</li>
 *   <li>each feature of each class,</li>
 *   <li>each enum,</li>
 *   <li>and each data type</li>
 * </ul>
 * <!-- end-user-doc -->
 * @see gapwright.model.GapwrightFactory
 * @model kind="package"
 * @generated
 */
public interface GapwrightPackage extends EPackage {
	/**
	 * The package name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	String eNAME = "model";

	/**
	 * The package namespace URI.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	String eNS_URI = "urn:gapwright:design:1";

	/**
	 * The package namespace name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	String eNS_PREFIX = "gapwright";

	/**
	 * The singleton instance of the package.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	GapwrightPackage eINSTANCE = gapwright.model.impl.GapwrightPackageImpl.init();

	/**
	 * The meta object id for the '{@link gapwright.model.impl.DesignImpl <em>Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.DesignImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getDesign()
	 * @generated
	 */
	int DESIGN = 0;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN__NAME = 0;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN__NOTES = 1;

	/**
	 * The feature id for the '<em><b>Materials</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN__MATERIALS = 2;

	/**
	 * The feature id for the '<em><b>Joints</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN__JOINTS = 3;

	/**
	 * The feature id for the '<em><b>Legs</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN__LEGS = 4;

	/**
	 * The feature id for the '<em><b>Air Paths</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN__AIR_PATHS = 5;

	/**
	 * The feature id for the '<em><b>Windings</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN__WINDINGS = 6;

	/**
	 * The feature id for the '<em><b>Operating Points</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN__OPERATING_POINTS = 7;

	/**
	 * The feature id for the '<em><b>Limits</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN__LIMITS = 8;

	/**
	 * The feature id for the '<em><b>Leakages</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN__LEAKAGES = 9;

	/**
	 * The feature id for the '<em><b>Connections</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN__CONNECTIONS = 10;

	/**
	 * The feature id for the '<em><b>Tolerances</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN__TOLERANCES = 11;

	/**
	 * The number of structural features of the '<em>Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN_FEATURE_COUNT = 12;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.ElementImpl <em>Element</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.ElementImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getElement()
	 * @generated
	 */
	int ELEMENT = 1;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ELEMENT__ID = 0;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ELEMENT__NAME = 1;

	/**
	 * The number of structural features of the '<em>Element</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ELEMENT_FEATURE_COUNT = 2;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.JointImpl <em>Joint</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.JointImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getJoint()
	 * @generated
	 */
	int JOINT = 2;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int JOINT__ID = ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int JOINT__NAME = ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>X</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int JOINT__X = ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Y</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int JOINT__Y = ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Joint</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int JOINT_FEATURE_COUNT = ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.LegImpl <em>Leg</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.LegImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getLeg()
	 * @generated
	 */
	int LEG = 3;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG__ID = ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG__NAME = ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>From</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG__FROM = ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>To</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG__TO = ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Material</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG__MATERIAL = ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Shape</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG__SHAPE = ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Width</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG__WIDTH = ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Depth</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG__DEPTH = ELEMENT_FEATURE_COUNT + 5;

	/**
	 * The feature id for the '<em><b>Diameter</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG__DIAMETER = ELEMENT_FEATURE_COUNT + 6;

	/**
	 * The feature id for the '<em><b>Area</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG__AREA = ELEMENT_FEATURE_COUNT + 7;

	/**
	 * The feature id for the '<em><b>Stacking Factor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG__STACKING_FACTOR = ELEMENT_FEATURE_COUNT + 8;

	/**
	 * The feature id for the '<em><b>Path Length</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG__PATH_LENGTH = ELEMENT_FEATURE_COUNT + 9;

	/**
	 * The feature id for the '<em><b>Gaps</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG__GAPS = ELEMENT_FEATURE_COUNT + 10;

	/**
	 * The feature id for the '<em><b>Magnet</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG__MAGNET = ELEMENT_FEATURE_COUNT + 11;

	/**
	 * The number of structural features of the '<em>Leg</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEG_FEATURE_COUNT = ELEMENT_FEATURE_COUNT + 12;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.GapImpl <em>Gap</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.GapImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getGap()
	 * @generated
	 */
	int GAP = 4;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAP__ID = ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAP__NAME = ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Length</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAP__LENGTH = ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Pieces</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAP__PIECES = ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Fringing</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAP__FRINGING = ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Window Height</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAP__WINDOW_HEIGHT = ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Position</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAP__POSITION = ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Place</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAP__PLACE = ELEMENT_FEATURE_COUNT + 5;

	/**
	 * The number of structural features of the '<em>Gap</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAP_FEATURE_COUNT = ELEMENT_FEATURE_COUNT + 6;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.MagnetImpl <em>Magnet</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.MagnetImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getMagnet()
	 * @generated
	 */
	int MAGNET = 5;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MAGNET__ID = ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MAGNET__NAME = ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Length</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MAGNET__LENGTH = ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Remanence</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MAGNET__REMANENCE = ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Recoil Permeability</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MAGNET__RECOIL_PERMEABILITY = ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Reversed</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MAGNET__REVERSED = ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Position</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MAGNET__POSITION = ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The number of structural features of the '<em>Magnet</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MAGNET_FEATURE_COUNT = ELEMENT_FEATURE_COUNT + 5;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.AirPathImpl <em>Air Path</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.AirPathImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getAirPath()
	 * @generated
	 */
	int AIR_PATH = 6;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AIR_PATH__ID = ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AIR_PATH__NAME = ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>From</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AIR_PATH__FROM = ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>To</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AIR_PATH__TO = ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Permeance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AIR_PATH__PERMEANCE = ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Area</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AIR_PATH__AREA = ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Length</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AIR_PATH__LENGTH = ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Leakage</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AIR_PATH__LEAKAGE = ELEMENT_FEATURE_COUNT + 5;

	/**
	 * The number of structural features of the '<em>Air Path</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AIR_PATH_FEATURE_COUNT = ELEMENT_FEATURE_COUNT + 6;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.WindingImpl <em>Winding</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.WindingImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getWinding()
	 * @generated
	 */
	int WINDING = 7;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING__ID = ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING__NAME = ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Coils</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING__COILS = ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Wire</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING__WIRE = ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Resistance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING__RESISTANCE = ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The number of structural features of the '<em>Winding</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_FEATURE_COUNT = ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.CoilImpl <em>Coil</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.CoilImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getCoil()
	 * @generated
	 */
	int COIL = 8;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COIL__ID = ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COIL__NAME = ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Leg</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COIL__LEG = ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Turns</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COIL__TURNS = ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Reversed</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COIL__REVERSED = ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Position</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COIL__POSITION = ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The number of structural features of the '<em>Coil</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COIL_FEATURE_COUNT = ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.MaterialImpl <em>Material</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.MaterialImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getMaterial()
	 * @generated
	 */
	int MATERIAL = 9;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__ID = ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__NAME = ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Curve</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__CURVE = ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Saturations</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__SATURATIONS = ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Loss</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__LOSS = ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Density</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__DENSITY = ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Source</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__SOURCE = ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Curve Temperature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__CURVE_TEMPERATURE = ELEMENT_FEATURE_COUNT + 5;

	/**
	 * The feature id for the '<em><b>Curve Scaling</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__CURVE_SCALING = ELEMENT_FEATURE_COUNT + 6;

	/**
	 * The feature id for the '<em><b>Other Curves</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__OTHER_CURVES = ELEMENT_FEATURE_COUNT + 7;

	/**
	 * The feature id for the '<em><b>Permeabilities</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__PERMEABILITIES = ELEMENT_FEATURE_COUNT + 8;

	/**
	 * The feature id for the '<em><b>Curie Temperature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__CURIE_TEMPERATURE = ELEMENT_FEATURE_COUNT + 9;

	/**
	 * The number of structural features of the '<em>Material</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL_FEATURE_COUNT = ELEMENT_FEATURE_COUNT + 10;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.CurveImpl <em>Curve</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.CurveImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getCurve()
	 * @generated
	 */
	int CURVE = 10;

	/**
	 * The number of structural features of the '<em>Curve</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURVE_FEATURE_COUNT = 0;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.LinearCurveImpl <em>Linear Curve</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.LinearCurveImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getLinearCurve()
	 * @generated
	 */
	int LINEAR_CURVE = 11;

	/**
	 * The feature id for the '<em><b>Relative Permeability</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINEAR_CURVE__RELATIVE_PERMEABILITY = CURVE_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Linear Curve</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINEAR_CURVE_FEATURE_COUNT = CURVE_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.KneeCurveImpl <em>Knee Curve</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.KneeCurveImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getKneeCurve()
	 * @generated
	 */
	int KNEE_CURVE = 12;

	/**
	 * The feature id for the '<em><b>Initial Permeability</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int KNEE_CURVE__INITIAL_PERMEABILITY = CURVE_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Saturation Polarisation</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int KNEE_CURVE__SATURATION_POLARISATION = CURVE_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Knee Curve</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int KNEE_CURVE_FEATURE_COUNT = CURVE_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.ArctanCurveImpl <em>Arctan Curve</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.ArctanCurveImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getArctanCurve()
	 * @generated
	 */
	int ARCTAN_CURVE = 13;

	/**
	 * The feature id for the '<em><b>Initial Permeability</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ARCTAN_CURVE__INITIAL_PERMEABILITY = CURVE_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Saturation Polarisation</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ARCTAN_CURVE__SATURATION_POLARISATION = CURVE_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Arctan Curve</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ARCTAN_CURVE_FEATURE_COUNT = CURVE_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.TableCurveImpl <em>Table Curve</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.TableCurveImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getTableCurve()
	 * @generated
	 */
	int TABLE_CURVE = 14;

	/**
	 * The feature id for the '<em><b>Points</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TABLE_CURVE__POINTS = CURVE_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Table Curve</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TABLE_CURVE_FEATURE_COUNT = CURVE_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.CurvePointImpl <em>Curve Point</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.CurvePointImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getCurvePoint()
	 * @generated
	 */
	int CURVE_POINT = 15;

	/**
	 * The feature id for the '<em><b>Field Strength</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURVE_POINT__FIELD_STRENGTH = 0;

	/**
	 * The feature id for the '<em><b>Flux Density</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURVE_POINT__FLUX_DENSITY = 1;

	/**
	 * The number of structural features of the '<em>Curve Point</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURVE_POINT_FEATURE_COUNT = 2;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.RollOffCurveImpl <em>Roll Off Curve</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.RollOffCurveImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getRollOffCurve()
	 * @generated
	 */
	int ROLL_OFF_CURVE = 16;

	/**
	 * The feature id for the '<em><b>Initial Permeability</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ROLL_OFF_CURVE__INITIAL_PERMEABILITY = CURVE_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Half Field Strength</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ROLL_OFF_CURVE__HALF_FIELD_STRENGTH = CURVE_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Exponent</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ROLL_OFF_CURVE__EXPONENT = CURVE_FEATURE_COUNT + 2;

	/**
	 * The number of structural features of the '<em>Roll Off Curve</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ROLL_OFF_CURVE_FEATURE_COUNT = CURVE_FEATURE_COUNT + 3;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.SaturationImpl <em>Saturation</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.SaturationImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getSaturation()
	 * @generated
	 */
	int SATURATION = 17;

	/**
	 * The feature id for the '<em><b>Temperature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SATURATION__TEMPERATURE = 0;

	/**
	 * The feature id for the '<em><b>Flux Density</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SATURATION__FLUX_DENSITY = 1;

	/**
	 * The number of structural features of the '<em>Saturation</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SATURATION_FEATURE_COUNT = 2;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.CurveAtTemperatureImpl <em>Curve At Temperature</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.CurveAtTemperatureImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getCurveAtTemperature()
	 * @generated
	 */
	int CURVE_AT_TEMPERATURE = 18;

	/**
	 * The feature id for the '<em><b>Temperature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURVE_AT_TEMPERATURE__TEMPERATURE = 0;

	/**
	 * The feature id for the '<em><b>Curve</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURVE_AT_TEMPERATURE__CURVE = 1;

	/**
	 * The number of structural features of the '<em>Curve At Temperature</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURVE_AT_TEMPERATURE_FEATURE_COUNT = 2;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.InitialPermeabilityImpl <em>Initial Permeability</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.InitialPermeabilityImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getInitialPermeability()
	 * @generated
	 */
	int INITIAL_PERMEABILITY = 19;

	/**
	 * The feature id for the '<em><b>Temperature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int INITIAL_PERMEABILITY__TEMPERATURE = 0;

	/**
	 * The feature id for the '<em><b>Relative Permeability</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int INITIAL_PERMEABILITY__RELATIVE_PERMEABILITY = 1;

	/**
	 * The number of structural features of the '<em>Initial Permeability</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int INITIAL_PERMEABILITY_FEATURE_COUNT = 2;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.SteinmetzLossImpl <em>Steinmetz Loss</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.SteinmetzLossImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getSteinmetzLoss()
	 * @generated
	 */
	int STEINMETZ_LOSS = 20;

	/**
	 * The feature id for the '<em><b>Coefficient</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEINMETZ_LOSS__COEFFICIENT = 0;

	/**
	 * The feature id for the '<em><b>Frequency Exponent</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEINMETZ_LOSS__FREQUENCY_EXPONENT = 1;

	/**
	 * The feature id for the '<em><b>Flux Density Exponent</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEINMETZ_LOSS__FLUX_DENSITY_EXPONENT = 2;

	/**
	 * The feature id for the '<em><b>Minimum Frequency</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEINMETZ_LOSS__MINIMUM_FREQUENCY = 3;

	/**
	 * The feature id for the '<em><b>Maximum Frequency</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEINMETZ_LOSS__MAXIMUM_FREQUENCY = 4;

	/**
	 * The feature id for the '<em><b>Temperature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEINMETZ_LOSS__TEMPERATURE = 5;

	/**
	 * The number of structural features of the '<em>Steinmetz Loss</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEINMETZ_LOSS_FEATURE_COUNT = 6;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.OperatingPointImpl <em>Operating Point</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.OperatingPointImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getOperatingPoint()
	 * @generated
	 */
	int OPERATING_POINT = 21;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OPERATING_POINT__ID = ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OPERATING_POINT__NAME = ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Temperature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OPERATING_POINT__TEMPERATURE = ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Frequency</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OPERATING_POINT__FREQUENCY = ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Drives</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OPERATING_POINT__DRIVES = ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The number of structural features of the '<em>Operating Point</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OPERATING_POINT_FEATURE_COUNT = ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.DriveImpl <em>Drive</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.DriveImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getDrive()
	 * @generated
	 */
	int DRIVE = 22;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DRIVE__ID = ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DRIVE__NAME = ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Winding</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DRIVE__WINDING = ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Drive</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DRIVE_FEATURE_COUNT = ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.CurrentDriveImpl <em>Current Drive</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.CurrentDriveImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getCurrentDrive()
	 * @generated
	 */
	int CURRENT_DRIVE = 23;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURRENT_DRIVE__ID = DRIVE__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURRENT_DRIVE__NAME = DRIVE__NAME;

	/**
	 * The feature id for the '<em><b>Winding</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURRENT_DRIVE__WINDING = DRIVE__WINDING;

	/**
	 * The feature id for the '<em><b>Current</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURRENT_DRIVE__CURRENT = DRIVE_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Ripple</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURRENT_DRIVE__RIPPLE = DRIVE_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Current Drive</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURRENT_DRIVE_FEATURE_COUNT = DRIVE_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.VoltageDriveImpl <em>Voltage Drive</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.VoltageDriveImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getVoltageDrive()
	 * @generated
	 */
	int VOLTAGE_DRIVE = 24;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int VOLTAGE_DRIVE__ID = DRIVE__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int VOLTAGE_DRIVE__NAME = DRIVE__NAME;

	/**
	 * The feature id for the '<em><b>Winding</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int VOLTAGE_DRIVE__WINDING = DRIVE__WINDING;

	/**
	 * The feature id for the '<em><b>Voltage</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int VOLTAGE_DRIVE__VOLTAGE = DRIVE_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>On Time</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int VOLTAGE_DRIVE__ON_TIME = DRIVE_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Bias</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int VOLTAGE_DRIVE__BIAS = DRIVE_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Waveform</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int VOLTAGE_DRIVE__WAVEFORM = DRIVE_FEATURE_COUNT + 3;

	/**
	 * The number of structural features of the '<em>Voltage Drive</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int VOLTAGE_DRIVE_FEATURE_COUNT = DRIVE_FEATURE_COUNT + 4;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.LimitsImpl <em>Limits</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.LimitsImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getLimits()
	 * @generated
	 */
	int LIMITS = 25;

	/**
	 * The feature id for the '<em><b>Near Fraction</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LIMITS__NEAR_FRACTION = 0;

	/**
	 * The number of structural features of the '<em>Limits</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LIMITS_FEATURE_COUNT = 1;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.WindingLeakageImpl <em>Winding Leakage</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.WindingLeakageImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getWindingLeakage()
	 * @generated
	 */
	int WINDING_LEAKAGE = 26;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_LEAKAGE__ID = ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_LEAKAGE__NAME = ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>First</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_LEAKAGE__FIRST = ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Second</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_LEAKAGE__SECOND = ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Arrangement</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_LEAKAGE__ARRANGEMENT = ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>First Build</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_LEAKAGE__FIRST_BUILD = ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Second Build</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_LEAKAGE__SECOND_BUILD = ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Separation</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_LEAKAGE__SEPARATION = ELEMENT_FEATURE_COUNT + 5;

	/**
	 * The feature id for the '<em><b>Height</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_LEAKAGE__HEIGHT = ELEMENT_FEATURE_COUNT + 6;

	/**
	 * The feature id for the '<em><b>Mean Turn</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_LEAKAGE__MEAN_TURN = ELEMENT_FEATURE_COUNT + 7;

	/**
	 * The feature id for the '<em><b>Interfaces</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_LEAKAGE__INTERFACES = ELEMENT_FEATURE_COUNT + 8;

	/**
	 * The number of structural features of the '<em>Winding Leakage</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_LEAKAGE_FEATURE_COUNT = ELEMENT_FEATURE_COUNT + 9;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.WindingConnectionImpl <em>Winding Connection</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.WindingConnectionImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getWindingConnection()
	 * @generated
	 */
	int WINDING_CONNECTION = 27;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_CONNECTION__ID = ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_CONNECTION__NAME = ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Kind</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_CONNECTION__KIND = ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Members</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_CONNECTION__MEMBERS = ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Winding Connection</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDING_CONNECTION_FEATURE_COUNT = ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.ConnectedWindingImpl <em>Connected Winding</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.ConnectedWindingImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getConnectedWinding()
	 * @generated
	 */
	int CONNECTED_WINDING = 28;

	/**
	 * The feature id for the '<em><b>Winding</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONNECTED_WINDING__WINDING = 0;

	/**
	 * The feature id for the '<em><b>Reversed</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONNECTED_WINDING__REVERSED = 1;

	/**
	 * The number of structural features of the '<em>Connected Winding</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONNECTED_WINDING_FEATURE_COUNT = 2;

	/**
	 * The meta object id for the '{@link gapwright.model.impl.ToleranceImpl <em>Tolerance</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.impl.ToleranceImpl
	 * @see gapwright.model.impl.GapwrightPackageImpl#getTolerance()
	 * @generated
	 */
	int TOLERANCE = 29;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TOLERANCE__ID = ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TOLERANCE__NAME = ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Targets</b></em>' reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TOLERANCE__TARGETS = ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Feature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TOLERANCE__FEATURE = ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Deviation</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TOLERANCE__DEVIATION = ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Distribution</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TOLERANCE__DISTRIBUTION = ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The number of structural features of the '<em>Tolerance</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TOLERANCE_FEATURE_COUNT = ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The meta object id for the '{@link gapwright.model.SectionShape <em>Section Shape</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.SectionShape
	 * @see gapwright.model.impl.GapwrightPackageImpl#getSectionShape()
	 * @generated
	 */
	int SECTION_SHAPE = 30;

	/**
	 * The meta object id for the '{@link gapwright.model.Fringing <em>Fringing</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.Fringing
	 * @see gapwright.model.impl.GapwrightPackageImpl#getFringing()
	 * @generated
	 */
	int FRINGING = 31;

	/**
	 * The meta object id for the '{@link gapwright.model.GapPlace <em>Gap Place</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.GapPlace
	 * @see gapwright.model.impl.GapwrightPackageImpl#getGapPlace()
	 * @generated
	 */
	int GAP_PLACE = 32;

	/**
	 * The meta object id for the '{@link gapwright.model.CurveScaling <em>Curve Scaling</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.CurveScaling
	 * @see gapwright.model.impl.GapwrightPackageImpl#getCurveScaling()
	 * @generated
	 */
	int CURVE_SCALING = 33;

	/**
	 * The meta object id for the '{@link gapwright.model.VoltageWaveform <em>Voltage Waveform</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.VoltageWaveform
	 * @see gapwright.model.impl.GapwrightPackageImpl#getVoltageWaveform()
	 * @generated
	 */
	int VOLTAGE_WAVEFORM = 34;

	/**
	 * The meta object id for the '{@link gapwright.model.WindingArrangement <em>Winding Arrangement</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.WindingArrangement
	 * @see gapwright.model.impl.GapwrightPackageImpl#getWindingArrangement()
	 * @generated
	 */
	int WINDING_ARRANGEMENT = 35;

	/**
	 * The meta object id for the '{@link gapwright.model.ConnectionKind <em>Connection Kind</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.ConnectionKind
	 * @see gapwright.model.impl.GapwrightPackageImpl#getConnectionKind()
	 * @generated
	 */
	int CONNECTION_KIND = 36;

	/**
	 * The meta object id for the '{@link gapwright.model.TolerancedFeature <em>Toleranced Feature</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.TolerancedFeature
	 * @see gapwright.model.impl.GapwrightPackageImpl#getTolerancedFeature()
	 * @generated
	 */
	int TOLERANCED_FEATURE = 37;

	/**
	 * The meta object id for the '{@link gapwright.model.Distribution <em>Distribution</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.Distribution
	 * @see gapwright.model.impl.GapwrightPackageImpl#getDistribution()
	 * @generated
	 */
	int DISTRIBUTION = 38;

	/**
	 * The meta object id for the '<em>Length</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.quantity.Quantity
	 * @see gapwright.model.impl.GapwrightPackageImpl#getLength()
	 * @generated
	 */
	int LENGTH = 39;

	/**
	 * The meta object id for the '<em>Area</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.quantity.Quantity
	 * @see gapwright.model.impl.GapwrightPackageImpl#getArea()
	 * @generated
	 */
	int AREA = 40;

	/**
	 * The meta object id for the '<em>Flux Density</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.quantity.Quantity
	 * @see gapwright.model.impl.GapwrightPackageImpl#getFluxDensity()
	 * @generated
	 */
	int FLUX_DENSITY = 41;

	/**
	 * The meta object id for the '<em>Field Strength</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.quantity.Quantity
	 * @see gapwright.model.impl.GapwrightPackageImpl#getFieldStrength()
	 * @generated
	 */
	int FIELD_STRENGTH = 42;

	/**
	 * The meta object id for the '<em>Current</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.quantity.Quantity
	 * @see gapwright.model.impl.GapwrightPackageImpl#getCurrent()
	 * @generated
	 */
	int CURRENT = 43;

	/**
	 * The meta object id for the '<em>Voltage</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.quantity.Quantity
	 * @see gapwright.model.impl.GapwrightPackageImpl#getVoltage()
	 * @generated
	 */
	int VOLTAGE = 44;

	/**
	 * The meta object id for the '<em>Time</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.quantity.Quantity
	 * @see gapwright.model.impl.GapwrightPackageImpl#getTime()
	 * @generated
	 */
	int TIME = 45;

	/**
	 * The meta object id for the '<em>Temperature</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.quantity.Quantity
	 * @see gapwright.model.impl.GapwrightPackageImpl#getTemperature()
	 * @generated
	 */
	int TEMPERATURE = 46;

	/**
	 * The meta object id for the '<em>Frequency</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.quantity.Quantity
	 * @see gapwright.model.impl.GapwrightPackageImpl#getFrequency()
	 * @generated
	 */
	int FREQUENCY = 47;

	/**
	 * The meta object id for the '<em>Resistance</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.quantity.Quantity
	 * @see gapwright.model.impl.GapwrightPackageImpl#getResistance()
	 * @generated
	 */
	int RESISTANCE = 48;

	/**
	 * The meta object id for the '<em>Permeance</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.quantity.Quantity
	 * @see gapwright.model.impl.GapwrightPackageImpl#getPermeance()
	 * @generated
	 */
	int PERMEANCE = 49;

	/**
	 * The meta object id for the '<em>Density</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.quantity.Quantity
	 * @see gapwright.model.impl.GapwrightPackageImpl#getDensity()
	 * @generated
	 */
	int DENSITY = 50;

	/**
	 * The meta object id for the '<em>Wire</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.quantity.Quantity
	 * @see gapwright.model.impl.GapwrightPackageImpl#getWire()
	 * @generated
	 */
	int WIRE = 51;

	/**
	 * The meta object id for the '<em>Deviation</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see gapwright.model.quantity.Quantity
	 * @see gapwright.model.impl.GapwrightPackageImpl#getDeviation()
	 * @generated
	 */
	int DEVIATION = 52;


	/**
	 * Returns the meta object for class '{@link gapwright.model.Design <em>Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Design</em>'.
	 * @see gapwright.model.Design
	 * @generated
	 */
	EClass getDesign();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Design#getName <em>Name</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Name</em>'.
	 * @see gapwright.model.Design#getName()
	 * @see #getDesign()
	 * @generated
	 */
	EAttribute getDesign_Name();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Design#getNotes <em>Notes</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Notes</em>'.
	 * @see gapwright.model.Design#getNotes()
	 * @see #getDesign()
	 * @generated
	 */
	EAttribute getDesign_Notes();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.Design#getMaterials <em>Materials</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Materials</em>'.
	 * @see gapwright.model.Design#getMaterials()
	 * @see #getDesign()
	 * @generated
	 */
	EReference getDesign_Materials();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.Design#getJoints <em>Joints</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Joints</em>'.
	 * @see gapwright.model.Design#getJoints()
	 * @see #getDesign()
	 * @generated
	 */
	EReference getDesign_Joints();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.Design#getLegs <em>Legs</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Legs</em>'.
	 * @see gapwright.model.Design#getLegs()
	 * @see #getDesign()
	 * @generated
	 */
	EReference getDesign_Legs();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.Design#getAirPaths <em>Air Paths</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Air Paths</em>'.
	 * @see gapwright.model.Design#getAirPaths()
	 * @see #getDesign()
	 * @generated
	 */
	EReference getDesign_AirPaths();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.Design#getWindings <em>Windings</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Windings</em>'.
	 * @see gapwright.model.Design#getWindings()
	 * @see #getDesign()
	 * @generated
	 */
	EReference getDesign_Windings();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.Design#getOperatingPoints <em>Operating Points</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Operating Points</em>'.
	 * @see gapwright.model.Design#getOperatingPoints()
	 * @see #getDesign()
	 * @generated
	 */
	EReference getDesign_OperatingPoints();

	/**
	 * Returns the meta object for the containment reference '{@link gapwright.model.Design#getLimits <em>Limits</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Limits</em>'.
	 * @see gapwright.model.Design#getLimits()
	 * @see #getDesign()
	 * @generated
	 */
	EReference getDesign_Limits();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.Design#getLeakages <em>Leakages</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Leakages</em>'.
	 * @see gapwright.model.Design#getLeakages()
	 * @see #getDesign()
	 * @generated
	 */
	EReference getDesign_Leakages();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.Design#getConnections <em>Connections</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Connections</em>'.
	 * @see gapwright.model.Design#getConnections()
	 * @see #getDesign()
	 * @generated
	 */
	EReference getDesign_Connections();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.Design#getTolerances <em>Tolerances</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Tolerances</em>'.
	 * @see gapwright.model.Design#getTolerances()
	 * @see #getDesign()
	 * @generated
	 */
	EReference getDesign_Tolerances();

	/**
	 * Returns the meta object for class '{@link gapwright.model.Element <em>Element</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Element</em>'.
	 * @see gapwright.model.Element
	 * @generated
	 */
	EClass getElement();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Element#getId <em>Id</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Id</em>'.
	 * @see gapwright.model.Element#getId()
	 * @see #getElement()
	 * @generated
	 */
	EAttribute getElement_Id();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Element#getName <em>Name</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Name</em>'.
	 * @see gapwright.model.Element#getName()
	 * @see #getElement()
	 * @generated
	 */
	EAttribute getElement_Name();

	/**
	 * Returns the meta object for class '{@link gapwright.model.Joint <em>Joint</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Joint</em>'.
	 * @see gapwright.model.Joint
	 * @generated
	 */
	EClass getJoint();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Joint#getX <em>X</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>X</em>'.
	 * @see gapwright.model.Joint#getX()
	 * @see #getJoint()
	 * @generated
	 */
	EAttribute getJoint_X();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Joint#getY <em>Y</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Y</em>'.
	 * @see gapwright.model.Joint#getY()
	 * @see #getJoint()
	 * @generated
	 */
	EAttribute getJoint_Y();

	/**
	 * Returns the meta object for class '{@link gapwright.model.Leg <em>Leg</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Leg</em>'.
	 * @see gapwright.model.Leg
	 * @generated
	 */
	EClass getLeg();

	/**
	 * Returns the meta object for the reference '{@link gapwright.model.Leg#getFrom <em>From</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>From</em>'.
	 * @see gapwright.model.Leg#getFrom()
	 * @see #getLeg()
	 * @generated
	 */
	EReference getLeg_From();

	/**
	 * Returns the meta object for the reference '{@link gapwright.model.Leg#getTo <em>To</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>To</em>'.
	 * @see gapwright.model.Leg#getTo()
	 * @see #getLeg()
	 * @generated
	 */
	EReference getLeg_To();

	/**
	 * Returns the meta object for the reference '{@link gapwright.model.Leg#getMaterial <em>Material</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Material</em>'.
	 * @see gapwright.model.Leg#getMaterial()
	 * @see #getLeg()
	 * @generated
	 */
	EReference getLeg_Material();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Leg#getShape <em>Shape</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Shape</em>'.
	 * @see gapwright.model.Leg#getShape()
	 * @see #getLeg()
	 * @generated
	 */
	EAttribute getLeg_Shape();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Leg#getWidth <em>Width</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Width</em>'.
	 * @see gapwright.model.Leg#getWidth()
	 * @see #getLeg()
	 * @generated
	 */
	EAttribute getLeg_Width();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Leg#getDepth <em>Depth</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Depth</em>'.
	 * @see gapwright.model.Leg#getDepth()
	 * @see #getLeg()
	 * @generated
	 */
	EAttribute getLeg_Depth();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Leg#getDiameter <em>Diameter</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Diameter</em>'.
	 * @see gapwright.model.Leg#getDiameter()
	 * @see #getLeg()
	 * @generated
	 */
	EAttribute getLeg_Diameter();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Leg#getArea <em>Area</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Area</em>'.
	 * @see gapwright.model.Leg#getArea()
	 * @see #getLeg()
	 * @generated
	 */
	EAttribute getLeg_Area();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Leg#getStackingFactor <em>Stacking Factor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Stacking Factor</em>'.
	 * @see gapwright.model.Leg#getStackingFactor()
	 * @see #getLeg()
	 * @generated
	 */
	EAttribute getLeg_StackingFactor();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Leg#getPathLength <em>Path Length</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Path Length</em>'.
	 * @see gapwright.model.Leg#getPathLength()
	 * @see #getLeg()
	 * @generated
	 */
	EAttribute getLeg_PathLength();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.Leg#getGaps <em>Gaps</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Gaps</em>'.
	 * @see gapwright.model.Leg#getGaps()
	 * @see #getLeg()
	 * @generated
	 */
	EReference getLeg_Gaps();

	/**
	 * Returns the meta object for the containment reference '{@link gapwright.model.Leg#getMagnet <em>Magnet</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Magnet</em>'.
	 * @see gapwright.model.Leg#getMagnet()
	 * @see #getLeg()
	 * @generated
	 */
	EReference getLeg_Magnet();

	/**
	 * Returns the meta object for class '{@link gapwright.model.Gap <em>Gap</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Gap</em>'.
	 * @see gapwright.model.Gap
	 * @generated
	 */
	EClass getGap();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Gap#getLength <em>Length</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Length</em>'.
	 * @see gapwright.model.Gap#getLength()
	 * @see #getGap()
	 * @generated
	 */
	EAttribute getGap_Length();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Gap#getPieces <em>Pieces</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Pieces</em>'.
	 * @see gapwright.model.Gap#getPieces()
	 * @see #getGap()
	 * @generated
	 */
	EAttribute getGap_Pieces();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Gap#getFringing <em>Fringing</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Fringing</em>'.
	 * @see gapwright.model.Gap#getFringing()
	 * @see #getGap()
	 * @generated
	 */
	EAttribute getGap_Fringing();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Gap#getWindowHeight <em>Window Height</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Window Height</em>'.
	 * @see gapwright.model.Gap#getWindowHeight()
	 * @see #getGap()
	 * @generated
	 */
	EAttribute getGap_WindowHeight();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Gap#getPosition <em>Position</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Position</em>'.
	 * @see gapwright.model.Gap#getPosition()
	 * @see #getGap()
	 * @generated
	 */
	EAttribute getGap_Position();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Gap#getPlace <em>Place</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Place</em>'.
	 * @see gapwright.model.Gap#getPlace()
	 * @see #getGap()
	 * @generated
	 */
	EAttribute getGap_Place();

	/**
	 * Returns the meta object for class '{@link gapwright.model.Magnet <em>Magnet</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Magnet</em>'.
	 * @see gapwright.model.Magnet
	 * @generated
	 */
	EClass getMagnet();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Magnet#getLength <em>Length</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Length</em>'.
	 * @see gapwright.model.Magnet#getLength()
	 * @see #getMagnet()
	 * @generated
	 */
	EAttribute getMagnet_Length();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Magnet#getRemanence <em>Remanence</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Remanence</em>'.
	 * @see gapwright.model.Magnet#getRemanence()
	 * @see #getMagnet()
	 * @generated
	 */
	EAttribute getMagnet_Remanence();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Magnet#getRecoilPermeability <em>Recoil Permeability</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Recoil Permeability</em>'.
	 * @see gapwright.model.Magnet#getRecoilPermeability()
	 * @see #getMagnet()
	 * @generated
	 */
	EAttribute getMagnet_RecoilPermeability();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Magnet#isReversed <em>Reversed</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Reversed</em>'.
	 * @see gapwright.model.Magnet#isReversed()
	 * @see #getMagnet()
	 * @generated
	 */
	EAttribute getMagnet_Reversed();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Magnet#getPosition <em>Position</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Position</em>'.
	 * @see gapwright.model.Magnet#getPosition()
	 * @see #getMagnet()
	 * @generated
	 */
	EAttribute getMagnet_Position();

	/**
	 * Returns the meta object for class '{@link gapwright.model.AirPath <em>Air Path</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Air Path</em>'.
	 * @see gapwright.model.AirPath
	 * @generated
	 */
	EClass getAirPath();

	/**
	 * Returns the meta object for the reference '{@link gapwright.model.AirPath#getFrom <em>From</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>From</em>'.
	 * @see gapwright.model.AirPath#getFrom()
	 * @see #getAirPath()
	 * @generated
	 */
	EReference getAirPath_From();

	/**
	 * Returns the meta object for the reference '{@link gapwright.model.AirPath#getTo <em>To</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>To</em>'.
	 * @see gapwright.model.AirPath#getTo()
	 * @see #getAirPath()
	 * @generated
	 */
	EReference getAirPath_To();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.AirPath#getPermeance <em>Permeance</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Permeance</em>'.
	 * @see gapwright.model.AirPath#getPermeance()
	 * @see #getAirPath()
	 * @generated
	 */
	EAttribute getAirPath_Permeance();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.AirPath#getArea <em>Area</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Area</em>'.
	 * @see gapwright.model.AirPath#getArea()
	 * @see #getAirPath()
	 * @generated
	 */
	EAttribute getAirPath_Area();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.AirPath#getLength <em>Length</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Length</em>'.
	 * @see gapwright.model.AirPath#getLength()
	 * @see #getAirPath()
	 * @generated
	 */
	EAttribute getAirPath_Length();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.AirPath#isLeakage <em>Leakage</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Leakage</em>'.
	 * @see gapwright.model.AirPath#isLeakage()
	 * @see #getAirPath()
	 * @generated
	 */
	EAttribute getAirPath_Leakage();

	/**
	 * Returns the meta object for class '{@link gapwright.model.Winding <em>Winding</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Winding</em>'.
	 * @see gapwright.model.Winding
	 * @generated
	 */
	EClass getWinding();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.Winding#getCoils <em>Coils</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Coils</em>'.
	 * @see gapwright.model.Winding#getCoils()
	 * @see #getWinding()
	 * @generated
	 */
	EReference getWinding_Coils();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Winding#getWire <em>Wire</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Wire</em>'.
	 * @see gapwright.model.Winding#getWire()
	 * @see #getWinding()
	 * @generated
	 */
	EAttribute getWinding_Wire();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Winding#getResistance <em>Resistance</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Resistance</em>'.
	 * @see gapwright.model.Winding#getResistance()
	 * @see #getWinding()
	 * @generated
	 */
	EAttribute getWinding_Resistance();

	/**
	 * Returns the meta object for class '{@link gapwright.model.Coil <em>Coil</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Coil</em>'.
	 * @see gapwright.model.Coil
	 * @generated
	 */
	EClass getCoil();

	/**
	 * Returns the meta object for the reference '{@link gapwright.model.Coil#getLeg <em>Leg</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Leg</em>'.
	 * @see gapwright.model.Coil#getLeg()
	 * @see #getCoil()
	 * @generated
	 */
	EReference getCoil_Leg();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Coil#getTurns <em>Turns</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Turns</em>'.
	 * @see gapwright.model.Coil#getTurns()
	 * @see #getCoil()
	 * @generated
	 */
	EAttribute getCoil_Turns();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Coil#isReversed <em>Reversed</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Reversed</em>'.
	 * @see gapwright.model.Coil#isReversed()
	 * @see #getCoil()
	 * @generated
	 */
	EAttribute getCoil_Reversed();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Coil#getPosition <em>Position</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Position</em>'.
	 * @see gapwright.model.Coil#getPosition()
	 * @see #getCoil()
	 * @generated
	 */
	EAttribute getCoil_Position();

	/**
	 * Returns the meta object for class '{@link gapwright.model.Material <em>Material</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Material</em>'.
	 * @see gapwright.model.Material
	 * @generated
	 */
	EClass getMaterial();

	/**
	 * Returns the meta object for the containment reference '{@link gapwright.model.Material#getCurve <em>Curve</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Curve</em>'.
	 * @see gapwright.model.Material#getCurve()
	 * @see #getMaterial()
	 * @generated
	 */
	EReference getMaterial_Curve();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.Material#getSaturations <em>Saturations</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Saturations</em>'.
	 * @see gapwright.model.Material#getSaturations()
	 * @see #getMaterial()
	 * @generated
	 */
	EReference getMaterial_Saturations();

	/**
	 * Returns the meta object for the containment reference '{@link gapwright.model.Material#getLoss <em>Loss</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Loss</em>'.
	 * @see gapwright.model.Material#getLoss()
	 * @see #getMaterial()
	 * @generated
	 */
	EReference getMaterial_Loss();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Material#getDensity <em>Density</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Density</em>'.
	 * @see gapwright.model.Material#getDensity()
	 * @see #getMaterial()
	 * @generated
	 */
	EAttribute getMaterial_Density();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Material#getSource <em>Source</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Source</em>'.
	 * @see gapwright.model.Material#getSource()
	 * @see #getMaterial()
	 * @generated
	 */
	EAttribute getMaterial_Source();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Material#getCurveTemperature <em>Curve Temperature</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Curve Temperature</em>'.
	 * @see gapwright.model.Material#getCurveTemperature()
	 * @see #getMaterial()
	 * @generated
	 */
	EAttribute getMaterial_CurveTemperature();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Material#getCurveScaling <em>Curve Scaling</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Curve Scaling</em>'.
	 * @see gapwright.model.Material#getCurveScaling()
	 * @see #getMaterial()
	 * @generated
	 */
	EAttribute getMaterial_CurveScaling();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.Material#getOtherCurves <em>Other Curves</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Other Curves</em>'.
	 * @see gapwright.model.Material#getOtherCurves()
	 * @see #getMaterial()
	 * @generated
	 */
	EReference getMaterial_OtherCurves();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.Material#getPermeabilities <em>Permeabilities</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Permeabilities</em>'.
	 * @see gapwright.model.Material#getPermeabilities()
	 * @see #getMaterial()
	 * @generated
	 */
	EReference getMaterial_Permeabilities();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Material#getCurieTemperature <em>Curie Temperature</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Curie Temperature</em>'.
	 * @see gapwright.model.Material#getCurieTemperature()
	 * @see #getMaterial()
	 * @generated
	 */
	EAttribute getMaterial_CurieTemperature();

	/**
	 * Returns the meta object for class '{@link gapwright.model.Curve <em>Curve</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Curve</em>'.
	 * @see gapwright.model.Curve
	 * @generated
	 */
	EClass getCurve();

	/**
	 * Returns the meta object for class '{@link gapwright.model.LinearCurve <em>Linear Curve</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Linear Curve</em>'.
	 * @see gapwright.model.LinearCurve
	 * @generated
	 */
	EClass getLinearCurve();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.LinearCurve#getRelativePermeability <em>Relative Permeability</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Relative Permeability</em>'.
	 * @see gapwright.model.LinearCurve#getRelativePermeability()
	 * @see #getLinearCurve()
	 * @generated
	 */
	EAttribute getLinearCurve_RelativePermeability();

	/**
	 * Returns the meta object for class '{@link gapwright.model.KneeCurve <em>Knee Curve</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Knee Curve</em>'.
	 * @see gapwright.model.KneeCurve
	 * @generated
	 */
	EClass getKneeCurve();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.KneeCurve#getInitialPermeability <em>Initial Permeability</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Initial Permeability</em>'.
	 * @see gapwright.model.KneeCurve#getInitialPermeability()
	 * @see #getKneeCurve()
	 * @generated
	 */
	EAttribute getKneeCurve_InitialPermeability();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.KneeCurve#getSaturationPolarisation <em>Saturation Polarisation</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Saturation Polarisation</em>'.
	 * @see gapwright.model.KneeCurve#getSaturationPolarisation()
	 * @see #getKneeCurve()
	 * @generated
	 */
	EAttribute getKneeCurve_SaturationPolarisation();

	/**
	 * Returns the meta object for class '{@link gapwright.model.ArctanCurve <em>Arctan Curve</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Arctan Curve</em>'.
	 * @see gapwright.model.ArctanCurve
	 * @generated
	 */
	EClass getArctanCurve();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.ArctanCurve#getInitialPermeability <em>Initial Permeability</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Initial Permeability</em>'.
	 * @see gapwright.model.ArctanCurve#getInitialPermeability()
	 * @see #getArctanCurve()
	 * @generated
	 */
	EAttribute getArctanCurve_InitialPermeability();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.ArctanCurve#getSaturationPolarisation <em>Saturation Polarisation</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Saturation Polarisation</em>'.
	 * @see gapwright.model.ArctanCurve#getSaturationPolarisation()
	 * @see #getArctanCurve()
	 * @generated
	 */
	EAttribute getArctanCurve_SaturationPolarisation();

	/**
	 * Returns the meta object for class '{@link gapwright.model.TableCurve <em>Table Curve</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Table Curve</em>'.
	 * @see gapwright.model.TableCurve
	 * @generated
	 */
	EClass getTableCurve();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.TableCurve#getPoints <em>Points</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Points</em>'.
	 * @see gapwright.model.TableCurve#getPoints()
	 * @see #getTableCurve()
	 * @generated
	 */
	EReference getTableCurve_Points();

	/**
	 * Returns the meta object for class '{@link gapwright.model.CurvePoint <em>Curve Point</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Curve Point</em>'.
	 * @see gapwright.model.CurvePoint
	 * @generated
	 */
	EClass getCurvePoint();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.CurvePoint#getFieldStrength <em>Field Strength</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Field Strength</em>'.
	 * @see gapwright.model.CurvePoint#getFieldStrength()
	 * @see #getCurvePoint()
	 * @generated
	 */
	EAttribute getCurvePoint_FieldStrength();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.CurvePoint#getFluxDensity <em>Flux Density</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Flux Density</em>'.
	 * @see gapwright.model.CurvePoint#getFluxDensity()
	 * @see #getCurvePoint()
	 * @generated
	 */
	EAttribute getCurvePoint_FluxDensity();

	/**
	 * Returns the meta object for class '{@link gapwright.model.RollOffCurve <em>Roll Off Curve</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Roll Off Curve</em>'.
	 * @see gapwright.model.RollOffCurve
	 * @generated
	 */
	EClass getRollOffCurve();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.RollOffCurve#getInitialPermeability <em>Initial Permeability</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Initial Permeability</em>'.
	 * @see gapwright.model.RollOffCurve#getInitialPermeability()
	 * @see #getRollOffCurve()
	 * @generated
	 */
	EAttribute getRollOffCurve_InitialPermeability();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.RollOffCurve#getHalfFieldStrength <em>Half Field Strength</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Half Field Strength</em>'.
	 * @see gapwright.model.RollOffCurve#getHalfFieldStrength()
	 * @see #getRollOffCurve()
	 * @generated
	 */
	EAttribute getRollOffCurve_HalfFieldStrength();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.RollOffCurve#getExponent <em>Exponent</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Exponent</em>'.
	 * @see gapwright.model.RollOffCurve#getExponent()
	 * @see #getRollOffCurve()
	 * @generated
	 */
	EAttribute getRollOffCurve_Exponent();

	/**
	 * Returns the meta object for class '{@link gapwright.model.Saturation <em>Saturation</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Saturation</em>'.
	 * @see gapwright.model.Saturation
	 * @generated
	 */
	EClass getSaturation();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Saturation#getTemperature <em>Temperature</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Temperature</em>'.
	 * @see gapwright.model.Saturation#getTemperature()
	 * @see #getSaturation()
	 * @generated
	 */
	EAttribute getSaturation_Temperature();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Saturation#getFluxDensity <em>Flux Density</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Flux Density</em>'.
	 * @see gapwright.model.Saturation#getFluxDensity()
	 * @see #getSaturation()
	 * @generated
	 */
	EAttribute getSaturation_FluxDensity();

	/**
	 * Returns the meta object for class '{@link gapwright.model.CurveAtTemperature <em>Curve At Temperature</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Curve At Temperature</em>'.
	 * @see gapwright.model.CurveAtTemperature
	 * @generated
	 */
	EClass getCurveAtTemperature();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.CurveAtTemperature#getTemperature <em>Temperature</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Temperature</em>'.
	 * @see gapwright.model.CurveAtTemperature#getTemperature()
	 * @see #getCurveAtTemperature()
	 * @generated
	 */
	EAttribute getCurveAtTemperature_Temperature();

	/**
	 * Returns the meta object for the containment reference '{@link gapwright.model.CurveAtTemperature#getCurve <em>Curve</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Curve</em>'.
	 * @see gapwright.model.CurveAtTemperature#getCurve()
	 * @see #getCurveAtTemperature()
	 * @generated
	 */
	EReference getCurveAtTemperature_Curve();

	/**
	 * Returns the meta object for class '{@link gapwright.model.InitialPermeability <em>Initial Permeability</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Initial Permeability</em>'.
	 * @see gapwright.model.InitialPermeability
	 * @generated
	 */
	EClass getInitialPermeability();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.InitialPermeability#getTemperature <em>Temperature</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Temperature</em>'.
	 * @see gapwright.model.InitialPermeability#getTemperature()
	 * @see #getInitialPermeability()
	 * @generated
	 */
	EAttribute getInitialPermeability_Temperature();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.InitialPermeability#getRelativePermeability <em>Relative Permeability</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Relative Permeability</em>'.
	 * @see gapwright.model.InitialPermeability#getRelativePermeability()
	 * @see #getInitialPermeability()
	 * @generated
	 */
	EAttribute getInitialPermeability_RelativePermeability();

	/**
	 * Returns the meta object for class '{@link gapwright.model.SteinmetzLoss <em>Steinmetz Loss</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Steinmetz Loss</em>'.
	 * @see gapwright.model.SteinmetzLoss
	 * @generated
	 */
	EClass getSteinmetzLoss();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.SteinmetzLoss#getCoefficient <em>Coefficient</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Coefficient</em>'.
	 * @see gapwright.model.SteinmetzLoss#getCoefficient()
	 * @see #getSteinmetzLoss()
	 * @generated
	 */
	EAttribute getSteinmetzLoss_Coefficient();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.SteinmetzLoss#getFrequencyExponent <em>Frequency Exponent</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Frequency Exponent</em>'.
	 * @see gapwright.model.SteinmetzLoss#getFrequencyExponent()
	 * @see #getSteinmetzLoss()
	 * @generated
	 */
	EAttribute getSteinmetzLoss_FrequencyExponent();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.SteinmetzLoss#getFluxDensityExponent <em>Flux Density Exponent</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Flux Density Exponent</em>'.
	 * @see gapwright.model.SteinmetzLoss#getFluxDensityExponent()
	 * @see #getSteinmetzLoss()
	 * @generated
	 */
	EAttribute getSteinmetzLoss_FluxDensityExponent();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.SteinmetzLoss#getMinimumFrequency <em>Minimum Frequency</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Minimum Frequency</em>'.
	 * @see gapwright.model.SteinmetzLoss#getMinimumFrequency()
	 * @see #getSteinmetzLoss()
	 * @generated
	 */
	EAttribute getSteinmetzLoss_MinimumFrequency();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.SteinmetzLoss#getMaximumFrequency <em>Maximum Frequency</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Maximum Frequency</em>'.
	 * @see gapwright.model.SteinmetzLoss#getMaximumFrequency()
	 * @see #getSteinmetzLoss()
	 * @generated
	 */
	EAttribute getSteinmetzLoss_MaximumFrequency();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.SteinmetzLoss#getTemperature <em>Temperature</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Temperature</em>'.
	 * @see gapwright.model.SteinmetzLoss#getTemperature()
	 * @see #getSteinmetzLoss()
	 * @generated
	 */
	EAttribute getSteinmetzLoss_Temperature();

	/**
	 * Returns the meta object for class '{@link gapwright.model.OperatingPoint <em>Operating Point</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Operating Point</em>'.
	 * @see gapwright.model.OperatingPoint
	 * @generated
	 */
	EClass getOperatingPoint();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.OperatingPoint#getTemperature <em>Temperature</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Temperature</em>'.
	 * @see gapwright.model.OperatingPoint#getTemperature()
	 * @see #getOperatingPoint()
	 * @generated
	 */
	EAttribute getOperatingPoint_Temperature();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.OperatingPoint#getFrequency <em>Frequency</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Frequency</em>'.
	 * @see gapwright.model.OperatingPoint#getFrequency()
	 * @see #getOperatingPoint()
	 * @generated
	 */
	EAttribute getOperatingPoint_Frequency();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.OperatingPoint#getDrives <em>Drives</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Drives</em>'.
	 * @see gapwright.model.OperatingPoint#getDrives()
	 * @see #getOperatingPoint()
	 * @generated
	 */
	EReference getOperatingPoint_Drives();

	/**
	 * Returns the meta object for class '{@link gapwright.model.Drive <em>Drive</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Drive</em>'.
	 * @see gapwright.model.Drive
	 * @generated
	 */
	EClass getDrive();

	/**
	 * Returns the meta object for the reference '{@link gapwright.model.Drive#getWinding <em>Winding</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Winding</em>'.
	 * @see gapwright.model.Drive#getWinding()
	 * @see #getDrive()
	 * @generated
	 */
	EReference getDrive_Winding();

	/**
	 * Returns the meta object for class '{@link gapwright.model.CurrentDrive <em>Current Drive</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Current Drive</em>'.
	 * @see gapwright.model.CurrentDrive
	 * @generated
	 */
	EClass getCurrentDrive();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.CurrentDrive#getCurrent <em>Current</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Current</em>'.
	 * @see gapwright.model.CurrentDrive#getCurrent()
	 * @see #getCurrentDrive()
	 * @generated
	 */
	EAttribute getCurrentDrive_Current();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.CurrentDrive#getRipple <em>Ripple</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Ripple</em>'.
	 * @see gapwright.model.CurrentDrive#getRipple()
	 * @see #getCurrentDrive()
	 * @generated
	 */
	EAttribute getCurrentDrive_Ripple();

	/**
	 * Returns the meta object for class '{@link gapwright.model.VoltageDrive <em>Voltage Drive</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Voltage Drive</em>'.
	 * @see gapwright.model.VoltageDrive
	 * @generated
	 */
	EClass getVoltageDrive();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.VoltageDrive#getVoltage <em>Voltage</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Voltage</em>'.
	 * @see gapwright.model.VoltageDrive#getVoltage()
	 * @see #getVoltageDrive()
	 * @generated
	 */
	EAttribute getVoltageDrive_Voltage();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.VoltageDrive#getOnTime <em>On Time</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>On Time</em>'.
	 * @see gapwright.model.VoltageDrive#getOnTime()
	 * @see #getVoltageDrive()
	 * @generated
	 */
	EAttribute getVoltageDrive_OnTime();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.VoltageDrive#getBias <em>Bias</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Bias</em>'.
	 * @see gapwright.model.VoltageDrive#getBias()
	 * @see #getVoltageDrive()
	 * @generated
	 */
	EAttribute getVoltageDrive_Bias();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.VoltageDrive#getWaveform <em>Waveform</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Waveform</em>'.
	 * @see gapwright.model.VoltageDrive#getWaveform()
	 * @see #getVoltageDrive()
	 * @generated
	 */
	EAttribute getVoltageDrive_Waveform();

	/**
	 * Returns the meta object for class '{@link gapwright.model.Limits <em>Limits</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Limits</em>'.
	 * @see gapwright.model.Limits
	 * @generated
	 */
	EClass getLimits();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Limits#getNearFraction <em>Near Fraction</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Near Fraction</em>'.
	 * @see gapwright.model.Limits#getNearFraction()
	 * @see #getLimits()
	 * @generated
	 */
	EAttribute getLimits_NearFraction();

	/**
	 * Returns the meta object for class '{@link gapwright.model.WindingLeakage <em>Winding Leakage</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Winding Leakage</em>'.
	 * @see gapwright.model.WindingLeakage
	 * @generated
	 */
	EClass getWindingLeakage();

	/**
	 * Returns the meta object for the reference '{@link gapwright.model.WindingLeakage#getFirst <em>First</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>First</em>'.
	 * @see gapwright.model.WindingLeakage#getFirst()
	 * @see #getWindingLeakage()
	 * @generated
	 */
	EReference getWindingLeakage_First();

	/**
	 * Returns the meta object for the reference '{@link gapwright.model.WindingLeakage#getSecond <em>Second</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Second</em>'.
	 * @see gapwright.model.WindingLeakage#getSecond()
	 * @see #getWindingLeakage()
	 * @generated
	 */
	EReference getWindingLeakage_Second();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.WindingLeakage#getArrangement <em>Arrangement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Arrangement</em>'.
	 * @see gapwright.model.WindingLeakage#getArrangement()
	 * @see #getWindingLeakage()
	 * @generated
	 */
	EAttribute getWindingLeakage_Arrangement();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.WindingLeakage#getFirstBuild <em>First Build</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>First Build</em>'.
	 * @see gapwright.model.WindingLeakage#getFirstBuild()
	 * @see #getWindingLeakage()
	 * @generated
	 */
	EAttribute getWindingLeakage_FirstBuild();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.WindingLeakage#getSecondBuild <em>Second Build</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Second Build</em>'.
	 * @see gapwright.model.WindingLeakage#getSecondBuild()
	 * @see #getWindingLeakage()
	 * @generated
	 */
	EAttribute getWindingLeakage_SecondBuild();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.WindingLeakage#getSeparation <em>Separation</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Separation</em>'.
	 * @see gapwright.model.WindingLeakage#getSeparation()
	 * @see #getWindingLeakage()
	 * @generated
	 */
	EAttribute getWindingLeakage_Separation();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.WindingLeakage#getHeight <em>Height</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Height</em>'.
	 * @see gapwright.model.WindingLeakage#getHeight()
	 * @see #getWindingLeakage()
	 * @generated
	 */
	EAttribute getWindingLeakage_Height();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.WindingLeakage#getMeanTurn <em>Mean Turn</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Mean Turn</em>'.
	 * @see gapwright.model.WindingLeakage#getMeanTurn()
	 * @see #getWindingLeakage()
	 * @generated
	 */
	EAttribute getWindingLeakage_MeanTurn();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.WindingLeakage#getInterfaces <em>Interfaces</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Interfaces</em>'.
	 * @see gapwright.model.WindingLeakage#getInterfaces()
	 * @see #getWindingLeakage()
	 * @generated
	 */
	EAttribute getWindingLeakage_Interfaces();

	/**
	 * Returns the meta object for class '{@link gapwright.model.WindingConnection <em>Winding Connection</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Winding Connection</em>'.
	 * @see gapwright.model.WindingConnection
	 * @generated
	 */
	EClass getWindingConnection();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.WindingConnection#getKind <em>Kind</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Kind</em>'.
	 * @see gapwright.model.WindingConnection#getKind()
	 * @see #getWindingConnection()
	 * @generated
	 */
	EAttribute getWindingConnection_Kind();

	/**
	 * Returns the meta object for the containment reference list '{@link gapwright.model.WindingConnection#getMembers <em>Members</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Members</em>'.
	 * @see gapwright.model.WindingConnection#getMembers()
	 * @see #getWindingConnection()
	 * @generated
	 */
	EReference getWindingConnection_Members();

	/**
	 * Returns the meta object for class '{@link gapwright.model.ConnectedWinding <em>Connected Winding</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Connected Winding</em>'.
	 * @see gapwright.model.ConnectedWinding
	 * @generated
	 */
	EClass getConnectedWinding();

	/**
	 * Returns the meta object for the reference '{@link gapwright.model.ConnectedWinding#getWinding <em>Winding</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Winding</em>'.
	 * @see gapwright.model.ConnectedWinding#getWinding()
	 * @see #getConnectedWinding()
	 * @generated
	 */
	EReference getConnectedWinding_Winding();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.ConnectedWinding#isReversed <em>Reversed</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Reversed</em>'.
	 * @see gapwright.model.ConnectedWinding#isReversed()
	 * @see #getConnectedWinding()
	 * @generated
	 */
	EAttribute getConnectedWinding_Reversed();

	/**
	 * Returns the meta object for class '{@link gapwright.model.Tolerance <em>Tolerance</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Tolerance</em>'.
	 * @see gapwright.model.Tolerance
	 * @generated
	 */
	EClass getTolerance();

	/**
	 * Returns the meta object for the reference list '{@link gapwright.model.Tolerance#getTargets <em>Targets</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference list '<em>Targets</em>'.
	 * @see gapwright.model.Tolerance#getTargets()
	 * @see #getTolerance()
	 * @generated
	 */
	EReference getTolerance_Targets();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Tolerance#getFeature <em>Feature</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Feature</em>'.
	 * @see gapwright.model.Tolerance#getFeature()
	 * @see #getTolerance()
	 * @generated
	 */
	EAttribute getTolerance_Feature();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Tolerance#getDeviation <em>Deviation</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Deviation</em>'.
	 * @see gapwright.model.Tolerance#getDeviation()
	 * @see #getTolerance()
	 * @generated
	 */
	EAttribute getTolerance_Deviation();

	/**
	 * Returns the meta object for the attribute '{@link gapwright.model.Tolerance#getDistribution <em>Distribution</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Distribution</em>'.
	 * @see gapwright.model.Tolerance#getDistribution()
	 * @see #getTolerance()
	 * @generated
	 */
	EAttribute getTolerance_Distribution();

	/**
	 * Returns the meta object for enum '{@link gapwright.model.SectionShape <em>Section Shape</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Section Shape</em>'.
	 * @see gapwright.model.SectionShape
	 * @generated
	 */
	EEnum getSectionShape();

	/**
	 * Returns the meta object for enum '{@link gapwright.model.Fringing <em>Fringing</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Fringing</em>'.
	 * @see gapwright.model.Fringing
	 * @generated
	 */
	EEnum getFringing();

	/**
	 * Returns the meta object for enum '{@link gapwright.model.GapPlace <em>Gap Place</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Gap Place</em>'.
	 * @see gapwright.model.GapPlace
	 * @generated
	 */
	EEnum getGapPlace();

	/**
	 * Returns the meta object for enum '{@link gapwright.model.CurveScaling <em>Curve Scaling</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Curve Scaling</em>'.
	 * @see gapwright.model.CurveScaling
	 * @generated
	 */
	EEnum getCurveScaling();

	/**
	 * Returns the meta object for enum '{@link gapwright.model.VoltageWaveform <em>Voltage Waveform</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Voltage Waveform</em>'.
	 * @see gapwright.model.VoltageWaveform
	 * @generated
	 */
	EEnum getVoltageWaveform();

	/**
	 * Returns the meta object for enum '{@link gapwright.model.WindingArrangement <em>Winding Arrangement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Winding Arrangement</em>'.
	 * @see gapwright.model.WindingArrangement
	 * @generated
	 */
	EEnum getWindingArrangement();

	/**
	 * Returns the meta object for enum '{@link gapwright.model.ConnectionKind <em>Connection Kind</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Connection Kind</em>'.
	 * @see gapwright.model.ConnectionKind
	 * @generated
	 */
	EEnum getConnectionKind();

	/**
	 * Returns the meta object for enum '{@link gapwright.model.TolerancedFeature <em>Toleranced Feature</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Toleranced Feature</em>'.
	 * @see gapwright.model.TolerancedFeature
	 * @generated
	 */
	EEnum getTolerancedFeature();

	/**
	 * Returns the meta object for enum '{@link gapwright.model.Distribution <em>Distribution</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Distribution</em>'.
	 * @see gapwright.model.Distribution
	 * @generated
	 */
	EEnum getDistribution();

	/**
	 * Returns the meta object for data type '{@link gapwright.model.quantity.Quantity <em>Length</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * Magnitude and unit as typed, for example 0.5 mm.
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Length</em>'.
	 * @see gapwright.model.quantity.Quantity
	 * @model instanceClass="gapwright.model.quantity.Quantity"
	 * @generated
	 */
	EDataType getLength();

	/**
	 * Returns the meta object for data type '{@link gapwright.model.quantity.Quantity <em>Area</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * Magnitude and unit as typed, for example 1.2 cm².
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Area</em>'.
	 * @see gapwright.model.quantity.Quantity
	 * @model instanceClass="gapwright.model.quantity.Quantity"
	 * @generated
	 */
	EDataType getArea();

	/**
	 * Returns the meta object for data type '{@link gapwright.model.quantity.Quantity <em>Flux Density</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * Magnitude and unit as typed, for example 0.39 T.
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Flux Density</em>'.
	 * @see gapwright.model.quantity.Quantity
	 * @model instanceClass="gapwright.model.quantity.Quantity"
	 * @generated
	 */
	EDataType getFluxDensity();

	/**
	 * Returns the meta object for data type '{@link gapwright.model.quantity.Quantity <em>Field Strength</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * Magnitude and unit as typed, for example 1200 A/m.
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Field Strength</em>'.
	 * @see gapwright.model.quantity.Quantity
	 * @model instanceClass="gapwright.model.quantity.Quantity"
	 * @generated
	 */
	EDataType getFieldStrength();

	/**
	 * Returns the meta object for data type '{@link gapwright.model.quantity.Quantity <em>Current</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * Magnitude and unit as typed, for example 14 A.
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Current</em>'.
	 * @see gapwright.model.quantity.Quantity
	 * @model instanceClass="gapwright.model.quantity.Quantity"
	 * @generated
	 */
	EDataType getCurrent();

	/**
	 * Returns the meta object for data type '{@link gapwright.model.quantity.Quantity <em>Voltage</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * Magnitude and unit as typed, for example 24 V.
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Voltage</em>'.
	 * @see gapwright.model.quantity.Quantity
	 * @model instanceClass="gapwright.model.quantity.Quantity"
	 * @generated
	 */
	EDataType getVoltage();

	/**
	 * Returns the meta object for data type '{@link gapwright.model.quantity.Quantity <em>Time</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * Magnitude and unit as typed, for example 5 µs.
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Time</em>'.
	 * @see gapwright.model.quantity.Quantity
	 * @model instanceClass="gapwright.model.quantity.Quantity"
	 * @generated
	 */
	EDataType getTime();

	/**
	 * Returns the meta object for data type '{@link gapwright.model.quantity.Quantity <em>Temperature</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * Magnitude and unit as typed, for example 100 °C.
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Temperature</em>'.
	 * @see gapwright.model.quantity.Quantity
	 * @model instanceClass="gapwright.model.quantity.Quantity"
	 * @generated
	 */
	EDataType getTemperature();

	/**
	 * Returns the meta object for data type '{@link gapwright.model.quantity.Quantity <em>Frequency</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * Magnitude and unit as typed, for example 50 kHz.
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Frequency</em>'.
	 * @see gapwright.model.quantity.Quantity
	 * @model instanceClass="gapwright.model.quantity.Quantity"
	 * @generated
	 */
	EDataType getFrequency();

	/**
	 * Returns the meta object for data type '{@link gapwright.model.quantity.Quantity <em>Resistance</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * Magnitude and unit as typed, for example 30 mΩ.
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Resistance</em>'.
	 * @see gapwright.model.quantity.Quantity
	 * @model instanceClass="gapwright.model.quantity.Quantity"
	 * @generated
	 */
	EDataType getResistance();

	/**
	 * Returns the meta object for data type '{@link gapwright.model.quantity.Quantity <em>Permeance</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * Magnitude and unit as typed, for example 20 nH.
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Permeance</em>'.
	 * @see gapwright.model.quantity.Quantity
	 * @model instanceClass="gapwright.model.quantity.Quantity"
	 * @generated
	 */
	EDataType getPermeance();

	/**
	 * Returns the meta object for data type '{@link gapwright.model.quantity.Quantity <em>Density</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * Magnitude and unit as typed, for example 4800 kg/m³.
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Density</em>'.
	 * @see gapwright.model.quantity.Quantity
	 * @model instanceClass="gapwright.model.quantity.Quantity"
	 * @generated
	 */
	EDataType getDensity();

	/**
	 * Returns the meta object for data type '{@link gapwright.model.quantity.Quantity <em>Wire</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * Magnitude and unit as typed, for example AWG 18.
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Wire</em>'.
	 * @see gapwright.model.quantity.Quantity
	 * @model instanceClass="gapwright.model.quantity.Quantity"
	 * @generated
	 */
	EDataType getWire();

	/**
	 * Returns the meta object for data type '{@link gapwright.model.quantity.Quantity <em>Deviation</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * A share in % or an amount with its unit, for example 10 % or 0.05 mm.
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Deviation</em>'.
	 * @see gapwright.model.quantity.Quantity
	 * @model instanceClass="gapwright.model.quantity.Quantity"
	 * @generated
	 */
	EDataType getDeviation();

	/**
	 * Returns the factory that creates the instances of the model.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the factory that creates the instances of the model.
	 * @generated
	 */
	GapwrightFactory getGapwrightFactory();

	/**
	 * <!-- begin-user-doc -->
	 * Defines literals for the meta objects that represent
	 * <ul>
	 *   <li>each class,</li>
	 *   <li>each feature of each class,</li>
	 *   <li>each enum,</li>
	 *   <li>and each data type</li>
	 * </ul>
	 * <!-- end-user-doc -->
	 * @generated
	 */
	interface Literals {
		/**
		 * The meta object literal for the '{@link gapwright.model.impl.DesignImpl <em>Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.DesignImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getDesign()
		 * @generated
		 */
		EClass DESIGN = eINSTANCE.getDesign();

		/**
		 * The meta object literal for the '<em><b>Name</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute DESIGN__NAME = eINSTANCE.getDesign_Name();

		/**
		 * The meta object literal for the '<em><b>Notes</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute DESIGN__NOTES = eINSTANCE.getDesign_Notes();

		/**
		 * The meta object literal for the '<em><b>Materials</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference DESIGN__MATERIALS = eINSTANCE.getDesign_Materials();

		/**
		 * The meta object literal for the '<em><b>Joints</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference DESIGN__JOINTS = eINSTANCE.getDesign_Joints();

		/**
		 * The meta object literal for the '<em><b>Legs</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference DESIGN__LEGS = eINSTANCE.getDesign_Legs();

		/**
		 * The meta object literal for the '<em><b>Air Paths</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference DESIGN__AIR_PATHS = eINSTANCE.getDesign_AirPaths();

		/**
		 * The meta object literal for the '<em><b>Windings</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference DESIGN__WINDINGS = eINSTANCE.getDesign_Windings();

		/**
		 * The meta object literal for the '<em><b>Operating Points</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference DESIGN__OPERATING_POINTS = eINSTANCE.getDesign_OperatingPoints();

		/**
		 * The meta object literal for the '<em><b>Limits</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference DESIGN__LIMITS = eINSTANCE.getDesign_Limits();

		/**
		 * The meta object literal for the '<em><b>Leakages</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference DESIGN__LEAKAGES = eINSTANCE.getDesign_Leakages();

		/**
		 * The meta object literal for the '<em><b>Connections</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference DESIGN__CONNECTIONS = eINSTANCE.getDesign_Connections();

		/**
		 * The meta object literal for the '<em><b>Tolerances</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference DESIGN__TOLERANCES = eINSTANCE.getDesign_Tolerances();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.ElementImpl <em>Element</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.ElementImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getElement()
		 * @generated
		 */
		EClass ELEMENT = eINSTANCE.getElement();

		/**
		 * The meta object literal for the '<em><b>Id</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ELEMENT__ID = eINSTANCE.getElement_Id();

		/**
		 * The meta object literal for the '<em><b>Name</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ELEMENT__NAME = eINSTANCE.getElement_Name();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.JointImpl <em>Joint</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.JointImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getJoint()
		 * @generated
		 */
		EClass JOINT = eINSTANCE.getJoint();

		/**
		 * The meta object literal for the '<em><b>X</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute JOINT__X = eINSTANCE.getJoint_X();

		/**
		 * The meta object literal for the '<em><b>Y</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute JOINT__Y = eINSTANCE.getJoint_Y();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.LegImpl <em>Leg</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.LegImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getLeg()
		 * @generated
		 */
		EClass LEG = eINSTANCE.getLeg();

		/**
		 * The meta object literal for the '<em><b>From</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference LEG__FROM = eINSTANCE.getLeg_From();

		/**
		 * The meta object literal for the '<em><b>To</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference LEG__TO = eINSTANCE.getLeg_To();

		/**
		 * The meta object literal for the '<em><b>Material</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference LEG__MATERIAL = eINSTANCE.getLeg_Material();

		/**
		 * The meta object literal for the '<em><b>Shape</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LEG__SHAPE = eINSTANCE.getLeg_Shape();

		/**
		 * The meta object literal for the '<em><b>Width</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LEG__WIDTH = eINSTANCE.getLeg_Width();

		/**
		 * The meta object literal for the '<em><b>Depth</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LEG__DEPTH = eINSTANCE.getLeg_Depth();

		/**
		 * The meta object literal for the '<em><b>Diameter</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LEG__DIAMETER = eINSTANCE.getLeg_Diameter();

		/**
		 * The meta object literal for the '<em><b>Area</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LEG__AREA = eINSTANCE.getLeg_Area();

		/**
		 * The meta object literal for the '<em><b>Stacking Factor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LEG__STACKING_FACTOR = eINSTANCE.getLeg_StackingFactor();

		/**
		 * The meta object literal for the '<em><b>Path Length</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LEG__PATH_LENGTH = eINSTANCE.getLeg_PathLength();

		/**
		 * The meta object literal for the '<em><b>Gaps</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference LEG__GAPS = eINSTANCE.getLeg_Gaps();

		/**
		 * The meta object literal for the '<em><b>Magnet</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference LEG__MAGNET = eINSTANCE.getLeg_Magnet();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.GapImpl <em>Gap</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.GapImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getGap()
		 * @generated
		 */
		EClass GAP = eINSTANCE.getGap();

		/**
		 * The meta object literal for the '<em><b>Length</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAP__LENGTH = eINSTANCE.getGap_Length();

		/**
		 * The meta object literal for the '<em><b>Pieces</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAP__PIECES = eINSTANCE.getGap_Pieces();

		/**
		 * The meta object literal for the '<em><b>Fringing</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAP__FRINGING = eINSTANCE.getGap_Fringing();

		/**
		 * The meta object literal for the '<em><b>Window Height</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAP__WINDOW_HEIGHT = eINSTANCE.getGap_WindowHeight();

		/**
		 * The meta object literal for the '<em><b>Position</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAP__POSITION = eINSTANCE.getGap_Position();

		/**
		 * The meta object literal for the '<em><b>Place</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAP__PLACE = eINSTANCE.getGap_Place();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.MagnetImpl <em>Magnet</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.MagnetImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getMagnet()
		 * @generated
		 */
		EClass MAGNET = eINSTANCE.getMagnet();

		/**
		 * The meta object literal for the '<em><b>Length</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MAGNET__LENGTH = eINSTANCE.getMagnet_Length();

		/**
		 * The meta object literal for the '<em><b>Remanence</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MAGNET__REMANENCE = eINSTANCE.getMagnet_Remanence();

		/**
		 * The meta object literal for the '<em><b>Recoil Permeability</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MAGNET__RECOIL_PERMEABILITY = eINSTANCE.getMagnet_RecoilPermeability();

		/**
		 * The meta object literal for the '<em><b>Reversed</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MAGNET__REVERSED = eINSTANCE.getMagnet_Reversed();

		/**
		 * The meta object literal for the '<em><b>Position</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MAGNET__POSITION = eINSTANCE.getMagnet_Position();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.AirPathImpl <em>Air Path</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.AirPathImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getAirPath()
		 * @generated
		 */
		EClass AIR_PATH = eINSTANCE.getAirPath();

		/**
		 * The meta object literal for the '<em><b>From</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference AIR_PATH__FROM = eINSTANCE.getAirPath_From();

		/**
		 * The meta object literal for the '<em><b>To</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference AIR_PATH__TO = eINSTANCE.getAirPath_To();

		/**
		 * The meta object literal for the '<em><b>Permeance</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute AIR_PATH__PERMEANCE = eINSTANCE.getAirPath_Permeance();

		/**
		 * The meta object literal for the '<em><b>Area</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute AIR_PATH__AREA = eINSTANCE.getAirPath_Area();

		/**
		 * The meta object literal for the '<em><b>Length</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute AIR_PATH__LENGTH = eINSTANCE.getAirPath_Length();

		/**
		 * The meta object literal for the '<em><b>Leakage</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute AIR_PATH__LEAKAGE = eINSTANCE.getAirPath_Leakage();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.WindingImpl <em>Winding</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.WindingImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getWinding()
		 * @generated
		 */
		EClass WINDING = eINSTANCE.getWinding();

		/**
		 * The meta object literal for the '<em><b>Coils</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference WINDING__COILS = eINSTANCE.getWinding_Coils();

		/**
		 * The meta object literal for the '<em><b>Wire</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute WINDING__WIRE = eINSTANCE.getWinding_Wire();

		/**
		 * The meta object literal for the '<em><b>Resistance</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute WINDING__RESISTANCE = eINSTANCE.getWinding_Resistance();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.CoilImpl <em>Coil</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.CoilImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getCoil()
		 * @generated
		 */
		EClass COIL = eINSTANCE.getCoil();

		/**
		 * The meta object literal for the '<em><b>Leg</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference COIL__LEG = eINSTANCE.getCoil_Leg();

		/**
		 * The meta object literal for the '<em><b>Turns</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute COIL__TURNS = eINSTANCE.getCoil_Turns();

		/**
		 * The meta object literal for the '<em><b>Reversed</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute COIL__REVERSED = eINSTANCE.getCoil_Reversed();

		/**
		 * The meta object literal for the '<em><b>Position</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute COIL__POSITION = eINSTANCE.getCoil_Position();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.MaterialImpl <em>Material</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.MaterialImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getMaterial()
		 * @generated
		 */
		EClass MATERIAL = eINSTANCE.getMaterial();

		/**
		 * The meta object literal for the '<em><b>Curve</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference MATERIAL__CURVE = eINSTANCE.getMaterial_Curve();

		/**
		 * The meta object literal for the '<em><b>Saturations</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference MATERIAL__SATURATIONS = eINSTANCE.getMaterial_Saturations();

		/**
		 * The meta object literal for the '<em><b>Loss</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference MATERIAL__LOSS = eINSTANCE.getMaterial_Loss();

		/**
		 * The meta object literal for the '<em><b>Density</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MATERIAL__DENSITY = eINSTANCE.getMaterial_Density();

		/**
		 * The meta object literal for the '<em><b>Source</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MATERIAL__SOURCE = eINSTANCE.getMaterial_Source();

		/**
		 * The meta object literal for the '<em><b>Curve Temperature</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MATERIAL__CURVE_TEMPERATURE = eINSTANCE.getMaterial_CurveTemperature();

		/**
		 * The meta object literal for the '<em><b>Curve Scaling</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MATERIAL__CURVE_SCALING = eINSTANCE.getMaterial_CurveScaling();

		/**
		 * The meta object literal for the '<em><b>Other Curves</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference MATERIAL__OTHER_CURVES = eINSTANCE.getMaterial_OtherCurves();

		/**
		 * The meta object literal for the '<em><b>Permeabilities</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference MATERIAL__PERMEABILITIES = eINSTANCE.getMaterial_Permeabilities();

		/**
		 * The meta object literal for the '<em><b>Curie Temperature</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MATERIAL__CURIE_TEMPERATURE = eINSTANCE.getMaterial_CurieTemperature();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.CurveImpl <em>Curve</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.CurveImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getCurve()
		 * @generated
		 */
		EClass CURVE = eINSTANCE.getCurve();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.LinearCurveImpl <em>Linear Curve</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.LinearCurveImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getLinearCurve()
		 * @generated
		 */
		EClass LINEAR_CURVE = eINSTANCE.getLinearCurve();

		/**
		 * The meta object literal for the '<em><b>Relative Permeability</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LINEAR_CURVE__RELATIVE_PERMEABILITY = eINSTANCE.getLinearCurve_RelativePermeability();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.KneeCurveImpl <em>Knee Curve</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.KneeCurveImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getKneeCurve()
		 * @generated
		 */
		EClass KNEE_CURVE = eINSTANCE.getKneeCurve();

		/**
		 * The meta object literal for the '<em><b>Initial Permeability</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute KNEE_CURVE__INITIAL_PERMEABILITY = eINSTANCE.getKneeCurve_InitialPermeability();

		/**
		 * The meta object literal for the '<em><b>Saturation Polarisation</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute KNEE_CURVE__SATURATION_POLARISATION = eINSTANCE.getKneeCurve_SaturationPolarisation();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.ArctanCurveImpl <em>Arctan Curve</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.ArctanCurveImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getArctanCurve()
		 * @generated
		 */
		EClass ARCTAN_CURVE = eINSTANCE.getArctanCurve();

		/**
		 * The meta object literal for the '<em><b>Initial Permeability</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ARCTAN_CURVE__INITIAL_PERMEABILITY = eINSTANCE.getArctanCurve_InitialPermeability();

		/**
		 * The meta object literal for the '<em><b>Saturation Polarisation</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ARCTAN_CURVE__SATURATION_POLARISATION = eINSTANCE.getArctanCurve_SaturationPolarisation();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.TableCurveImpl <em>Table Curve</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.TableCurveImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getTableCurve()
		 * @generated
		 */
		EClass TABLE_CURVE = eINSTANCE.getTableCurve();

		/**
		 * The meta object literal for the '<em><b>Points</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference TABLE_CURVE__POINTS = eINSTANCE.getTableCurve_Points();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.CurvePointImpl <em>Curve Point</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.CurvePointImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getCurvePoint()
		 * @generated
		 */
		EClass CURVE_POINT = eINSTANCE.getCurvePoint();

		/**
		 * The meta object literal for the '<em><b>Field Strength</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CURVE_POINT__FIELD_STRENGTH = eINSTANCE.getCurvePoint_FieldStrength();

		/**
		 * The meta object literal for the '<em><b>Flux Density</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CURVE_POINT__FLUX_DENSITY = eINSTANCE.getCurvePoint_FluxDensity();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.RollOffCurveImpl <em>Roll Off Curve</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.RollOffCurveImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getRollOffCurve()
		 * @generated
		 */
		EClass ROLL_OFF_CURVE = eINSTANCE.getRollOffCurve();

		/**
		 * The meta object literal for the '<em><b>Initial Permeability</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ROLL_OFF_CURVE__INITIAL_PERMEABILITY = eINSTANCE.getRollOffCurve_InitialPermeability();

		/**
		 * The meta object literal for the '<em><b>Half Field Strength</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ROLL_OFF_CURVE__HALF_FIELD_STRENGTH = eINSTANCE.getRollOffCurve_HalfFieldStrength();

		/**
		 * The meta object literal for the '<em><b>Exponent</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ROLL_OFF_CURVE__EXPONENT = eINSTANCE.getRollOffCurve_Exponent();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.SaturationImpl <em>Saturation</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.SaturationImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getSaturation()
		 * @generated
		 */
		EClass SATURATION = eINSTANCE.getSaturation();

		/**
		 * The meta object literal for the '<em><b>Temperature</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SATURATION__TEMPERATURE = eINSTANCE.getSaturation_Temperature();

		/**
		 * The meta object literal for the '<em><b>Flux Density</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SATURATION__FLUX_DENSITY = eINSTANCE.getSaturation_FluxDensity();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.CurveAtTemperatureImpl <em>Curve At Temperature</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.CurveAtTemperatureImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getCurveAtTemperature()
		 * @generated
		 */
		EClass CURVE_AT_TEMPERATURE = eINSTANCE.getCurveAtTemperature();

		/**
		 * The meta object literal for the '<em><b>Temperature</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CURVE_AT_TEMPERATURE__TEMPERATURE = eINSTANCE.getCurveAtTemperature_Temperature();

		/**
		 * The meta object literal for the '<em><b>Curve</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference CURVE_AT_TEMPERATURE__CURVE = eINSTANCE.getCurveAtTemperature_Curve();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.InitialPermeabilityImpl <em>Initial Permeability</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.InitialPermeabilityImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getInitialPermeability()
		 * @generated
		 */
		EClass INITIAL_PERMEABILITY = eINSTANCE.getInitialPermeability();

		/**
		 * The meta object literal for the '<em><b>Temperature</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute INITIAL_PERMEABILITY__TEMPERATURE = eINSTANCE.getInitialPermeability_Temperature();

		/**
		 * The meta object literal for the '<em><b>Relative Permeability</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute INITIAL_PERMEABILITY__RELATIVE_PERMEABILITY = eINSTANCE.getInitialPermeability_RelativePermeability();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.SteinmetzLossImpl <em>Steinmetz Loss</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.SteinmetzLossImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getSteinmetzLoss()
		 * @generated
		 */
		EClass STEINMETZ_LOSS = eINSTANCE.getSteinmetzLoss();

		/**
		 * The meta object literal for the '<em><b>Coefficient</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STEINMETZ_LOSS__COEFFICIENT = eINSTANCE.getSteinmetzLoss_Coefficient();

		/**
		 * The meta object literal for the '<em><b>Frequency Exponent</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STEINMETZ_LOSS__FREQUENCY_EXPONENT = eINSTANCE.getSteinmetzLoss_FrequencyExponent();

		/**
		 * The meta object literal for the '<em><b>Flux Density Exponent</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STEINMETZ_LOSS__FLUX_DENSITY_EXPONENT = eINSTANCE.getSteinmetzLoss_FluxDensityExponent();

		/**
		 * The meta object literal for the '<em><b>Minimum Frequency</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STEINMETZ_LOSS__MINIMUM_FREQUENCY = eINSTANCE.getSteinmetzLoss_MinimumFrequency();

		/**
		 * The meta object literal for the '<em><b>Maximum Frequency</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STEINMETZ_LOSS__MAXIMUM_FREQUENCY = eINSTANCE.getSteinmetzLoss_MaximumFrequency();

		/**
		 * The meta object literal for the '<em><b>Temperature</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STEINMETZ_LOSS__TEMPERATURE = eINSTANCE.getSteinmetzLoss_Temperature();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.OperatingPointImpl <em>Operating Point</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.OperatingPointImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getOperatingPoint()
		 * @generated
		 */
		EClass OPERATING_POINT = eINSTANCE.getOperatingPoint();

		/**
		 * The meta object literal for the '<em><b>Temperature</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute OPERATING_POINT__TEMPERATURE = eINSTANCE.getOperatingPoint_Temperature();

		/**
		 * The meta object literal for the '<em><b>Frequency</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute OPERATING_POINT__FREQUENCY = eINSTANCE.getOperatingPoint_Frequency();

		/**
		 * The meta object literal for the '<em><b>Drives</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference OPERATING_POINT__DRIVES = eINSTANCE.getOperatingPoint_Drives();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.DriveImpl <em>Drive</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.DriveImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getDrive()
		 * @generated
		 */
		EClass DRIVE = eINSTANCE.getDrive();

		/**
		 * The meta object literal for the '<em><b>Winding</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference DRIVE__WINDING = eINSTANCE.getDrive_Winding();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.CurrentDriveImpl <em>Current Drive</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.CurrentDriveImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getCurrentDrive()
		 * @generated
		 */
		EClass CURRENT_DRIVE = eINSTANCE.getCurrentDrive();

		/**
		 * The meta object literal for the '<em><b>Current</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CURRENT_DRIVE__CURRENT = eINSTANCE.getCurrentDrive_Current();

		/**
		 * The meta object literal for the '<em><b>Ripple</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CURRENT_DRIVE__RIPPLE = eINSTANCE.getCurrentDrive_Ripple();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.VoltageDriveImpl <em>Voltage Drive</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.VoltageDriveImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getVoltageDrive()
		 * @generated
		 */
		EClass VOLTAGE_DRIVE = eINSTANCE.getVoltageDrive();

		/**
		 * The meta object literal for the '<em><b>Voltage</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute VOLTAGE_DRIVE__VOLTAGE = eINSTANCE.getVoltageDrive_Voltage();

		/**
		 * The meta object literal for the '<em><b>On Time</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute VOLTAGE_DRIVE__ON_TIME = eINSTANCE.getVoltageDrive_OnTime();

		/**
		 * The meta object literal for the '<em><b>Bias</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute VOLTAGE_DRIVE__BIAS = eINSTANCE.getVoltageDrive_Bias();

		/**
		 * The meta object literal for the '<em><b>Waveform</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute VOLTAGE_DRIVE__WAVEFORM = eINSTANCE.getVoltageDrive_Waveform();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.LimitsImpl <em>Limits</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.LimitsImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getLimits()
		 * @generated
		 */
		EClass LIMITS = eINSTANCE.getLimits();

		/**
		 * The meta object literal for the '<em><b>Near Fraction</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LIMITS__NEAR_FRACTION = eINSTANCE.getLimits_NearFraction();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.WindingLeakageImpl <em>Winding Leakage</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.WindingLeakageImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getWindingLeakage()
		 * @generated
		 */
		EClass WINDING_LEAKAGE = eINSTANCE.getWindingLeakage();

		/**
		 * The meta object literal for the '<em><b>First</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference WINDING_LEAKAGE__FIRST = eINSTANCE.getWindingLeakage_First();

		/**
		 * The meta object literal for the '<em><b>Second</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference WINDING_LEAKAGE__SECOND = eINSTANCE.getWindingLeakage_Second();

		/**
		 * The meta object literal for the '<em><b>Arrangement</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute WINDING_LEAKAGE__ARRANGEMENT = eINSTANCE.getWindingLeakage_Arrangement();

		/**
		 * The meta object literal for the '<em><b>First Build</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute WINDING_LEAKAGE__FIRST_BUILD = eINSTANCE.getWindingLeakage_FirstBuild();

		/**
		 * The meta object literal for the '<em><b>Second Build</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute WINDING_LEAKAGE__SECOND_BUILD = eINSTANCE.getWindingLeakage_SecondBuild();

		/**
		 * The meta object literal for the '<em><b>Separation</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute WINDING_LEAKAGE__SEPARATION = eINSTANCE.getWindingLeakage_Separation();

		/**
		 * The meta object literal for the '<em><b>Height</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute WINDING_LEAKAGE__HEIGHT = eINSTANCE.getWindingLeakage_Height();

		/**
		 * The meta object literal for the '<em><b>Mean Turn</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute WINDING_LEAKAGE__MEAN_TURN = eINSTANCE.getWindingLeakage_MeanTurn();

		/**
		 * The meta object literal for the '<em><b>Interfaces</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute WINDING_LEAKAGE__INTERFACES = eINSTANCE.getWindingLeakage_Interfaces();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.WindingConnectionImpl <em>Winding Connection</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.WindingConnectionImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getWindingConnection()
		 * @generated
		 */
		EClass WINDING_CONNECTION = eINSTANCE.getWindingConnection();

		/**
		 * The meta object literal for the '<em><b>Kind</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute WINDING_CONNECTION__KIND = eINSTANCE.getWindingConnection_Kind();

		/**
		 * The meta object literal for the '<em><b>Members</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference WINDING_CONNECTION__MEMBERS = eINSTANCE.getWindingConnection_Members();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.ConnectedWindingImpl <em>Connected Winding</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.ConnectedWindingImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getConnectedWinding()
		 * @generated
		 */
		EClass CONNECTED_WINDING = eINSTANCE.getConnectedWinding();

		/**
		 * The meta object literal for the '<em><b>Winding</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference CONNECTED_WINDING__WINDING = eINSTANCE.getConnectedWinding_Winding();

		/**
		 * The meta object literal for the '<em><b>Reversed</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONNECTED_WINDING__REVERSED = eINSTANCE.getConnectedWinding_Reversed();

		/**
		 * The meta object literal for the '{@link gapwright.model.impl.ToleranceImpl <em>Tolerance</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.impl.ToleranceImpl
		 * @see gapwright.model.impl.GapwrightPackageImpl#getTolerance()
		 * @generated
		 */
		EClass TOLERANCE = eINSTANCE.getTolerance();

		/**
		 * The meta object literal for the '<em><b>Targets</b></em>' reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference TOLERANCE__TARGETS = eINSTANCE.getTolerance_Targets();

		/**
		 * The meta object literal for the '<em><b>Feature</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute TOLERANCE__FEATURE = eINSTANCE.getTolerance_Feature();

		/**
		 * The meta object literal for the '<em><b>Deviation</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute TOLERANCE__DEVIATION = eINSTANCE.getTolerance_Deviation();

		/**
		 * The meta object literal for the '<em><b>Distribution</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute TOLERANCE__DISTRIBUTION = eINSTANCE.getTolerance_Distribution();

		/**
		 * The meta object literal for the '{@link gapwright.model.SectionShape <em>Section Shape</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.SectionShape
		 * @see gapwright.model.impl.GapwrightPackageImpl#getSectionShape()
		 * @generated
		 */
		EEnum SECTION_SHAPE = eINSTANCE.getSectionShape();

		/**
		 * The meta object literal for the '{@link gapwright.model.Fringing <em>Fringing</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.Fringing
		 * @see gapwright.model.impl.GapwrightPackageImpl#getFringing()
		 * @generated
		 */
		EEnum FRINGING = eINSTANCE.getFringing();

		/**
		 * The meta object literal for the '{@link gapwright.model.GapPlace <em>Gap Place</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.GapPlace
		 * @see gapwright.model.impl.GapwrightPackageImpl#getGapPlace()
		 * @generated
		 */
		EEnum GAP_PLACE = eINSTANCE.getGapPlace();

		/**
		 * The meta object literal for the '{@link gapwright.model.CurveScaling <em>Curve Scaling</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.CurveScaling
		 * @see gapwright.model.impl.GapwrightPackageImpl#getCurveScaling()
		 * @generated
		 */
		EEnum CURVE_SCALING = eINSTANCE.getCurveScaling();

		/**
		 * The meta object literal for the '{@link gapwright.model.VoltageWaveform <em>Voltage Waveform</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.VoltageWaveform
		 * @see gapwright.model.impl.GapwrightPackageImpl#getVoltageWaveform()
		 * @generated
		 */
		EEnum VOLTAGE_WAVEFORM = eINSTANCE.getVoltageWaveform();

		/**
		 * The meta object literal for the '{@link gapwright.model.WindingArrangement <em>Winding Arrangement</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.WindingArrangement
		 * @see gapwright.model.impl.GapwrightPackageImpl#getWindingArrangement()
		 * @generated
		 */
		EEnum WINDING_ARRANGEMENT = eINSTANCE.getWindingArrangement();

		/**
		 * The meta object literal for the '{@link gapwright.model.ConnectionKind <em>Connection Kind</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.ConnectionKind
		 * @see gapwright.model.impl.GapwrightPackageImpl#getConnectionKind()
		 * @generated
		 */
		EEnum CONNECTION_KIND = eINSTANCE.getConnectionKind();

		/**
		 * The meta object literal for the '{@link gapwright.model.TolerancedFeature <em>Toleranced Feature</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.TolerancedFeature
		 * @see gapwright.model.impl.GapwrightPackageImpl#getTolerancedFeature()
		 * @generated
		 */
		EEnum TOLERANCED_FEATURE = eINSTANCE.getTolerancedFeature();

		/**
		 * The meta object literal for the '{@link gapwright.model.Distribution <em>Distribution</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.Distribution
		 * @see gapwright.model.impl.GapwrightPackageImpl#getDistribution()
		 * @generated
		 */
		EEnum DISTRIBUTION = eINSTANCE.getDistribution();

		/**
		 * The meta object literal for the '<em>Length</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.quantity.Quantity
		 * @see gapwright.model.impl.GapwrightPackageImpl#getLength()
		 * @generated
		 */
		EDataType LENGTH = eINSTANCE.getLength();

		/**
		 * The meta object literal for the '<em>Area</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.quantity.Quantity
		 * @see gapwright.model.impl.GapwrightPackageImpl#getArea()
		 * @generated
		 */
		EDataType AREA = eINSTANCE.getArea();

		/**
		 * The meta object literal for the '<em>Flux Density</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.quantity.Quantity
		 * @see gapwright.model.impl.GapwrightPackageImpl#getFluxDensity()
		 * @generated
		 */
		EDataType FLUX_DENSITY = eINSTANCE.getFluxDensity();

		/**
		 * The meta object literal for the '<em>Field Strength</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.quantity.Quantity
		 * @see gapwright.model.impl.GapwrightPackageImpl#getFieldStrength()
		 * @generated
		 */
		EDataType FIELD_STRENGTH = eINSTANCE.getFieldStrength();

		/**
		 * The meta object literal for the '<em>Current</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.quantity.Quantity
		 * @see gapwright.model.impl.GapwrightPackageImpl#getCurrent()
		 * @generated
		 */
		EDataType CURRENT = eINSTANCE.getCurrent();

		/**
		 * The meta object literal for the '<em>Voltage</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.quantity.Quantity
		 * @see gapwright.model.impl.GapwrightPackageImpl#getVoltage()
		 * @generated
		 */
		EDataType VOLTAGE = eINSTANCE.getVoltage();

		/**
		 * The meta object literal for the '<em>Time</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.quantity.Quantity
		 * @see gapwright.model.impl.GapwrightPackageImpl#getTime()
		 * @generated
		 */
		EDataType TIME = eINSTANCE.getTime();

		/**
		 * The meta object literal for the '<em>Temperature</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.quantity.Quantity
		 * @see gapwright.model.impl.GapwrightPackageImpl#getTemperature()
		 * @generated
		 */
		EDataType TEMPERATURE = eINSTANCE.getTemperature();

		/**
		 * The meta object literal for the '<em>Frequency</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.quantity.Quantity
		 * @see gapwright.model.impl.GapwrightPackageImpl#getFrequency()
		 * @generated
		 */
		EDataType FREQUENCY = eINSTANCE.getFrequency();

		/**
		 * The meta object literal for the '<em>Resistance</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.quantity.Quantity
		 * @see gapwright.model.impl.GapwrightPackageImpl#getResistance()
		 * @generated
		 */
		EDataType RESISTANCE = eINSTANCE.getResistance();

		/**
		 * The meta object literal for the '<em>Permeance</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.quantity.Quantity
		 * @see gapwright.model.impl.GapwrightPackageImpl#getPermeance()
		 * @generated
		 */
		EDataType PERMEANCE = eINSTANCE.getPermeance();

		/**
		 * The meta object literal for the '<em>Density</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.quantity.Quantity
		 * @see gapwright.model.impl.GapwrightPackageImpl#getDensity()
		 * @generated
		 */
		EDataType DENSITY = eINSTANCE.getDensity();

		/**
		 * The meta object literal for the '<em>Wire</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.quantity.Quantity
		 * @see gapwright.model.impl.GapwrightPackageImpl#getWire()
		 * @generated
		 */
		EDataType WIRE = eINSTANCE.getWire();

		/**
		 * The meta object literal for the '<em>Deviation</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see gapwright.model.quantity.Quantity
		 * @see gapwright.model.impl.GapwrightPackageImpl#getDeviation()
		 * @generated
		 */
		EDataType DEVIATION = eINSTANCE.getDeviation();

	}

} //GapwrightPackage
